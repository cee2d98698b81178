import type { Migration } from './migrator'

/** Terms, the explainers behind them, the claims in those, the publications they were held against, and where terms are heard. */
export const up: Migration = async ({ context: { run } }) => {
  await run(`
    create table explainers (
      id uuid primary key default gen_random_uuid(),
      slug text not null unique,
      title text not null,
      summary text not null default '',
      body text not null,
      caution text,
      state text not null default 'draft' check (state in ('draft', 'in check', 'checked', 'due')),
      author_id uuid references users on delete set null,
      checked_by uuid references users on delete set null,
      checked_on date,
      edition integer not null default 1,
      content_hash text,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    );
    create index explainers_author on explainers (author_id);
    create index explainers_checked_by on explainers (checked_by);

    create table sources (
      id uuid primary key default gen_random_uuid(),
      key text not null unique,
      title text not null,
      authors text[] not null default '{}',
      publisher text,
      year integer,
      url text,
      csl jsonb not null default '{}',
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    );

    create table claims (
      id uuid primary key default gen_random_uuid(),
      explainer_id uuid not null references explainers on delete cascade,
      key text not null,
      statement text not null,
      quantity text,
      low double precision,
      high double precision,
      unit text,
      source_id uuid references sources,
      locator text,
      basis text not null default 'from memory',
      verdict text check (verdict in ('agrees', 'differs', 'not found')),
      note text,
      checked_by_name text,
      checked_by uuid references users on delete set null,
      checked_on date,
      position integer not null default 0,
      unique (explainer_id, key),
      check (low is null or high is null or low <= high),
      check (verdict is null or checked_on is not null)
    );
    create index claims_source on claims (source_id);
    create index claims_checked_by on claims (checked_by);

    create table terms (
      id uuid primary key default gen_random_uuid(),
      slug text not null unique,
      label text not null,
      definition text not null,
      field text not null,
      synonyms text[] not null default '{}',
      inflections text[] not null default '{}',
      regional jsonb not null default '[]',
      context jsonb,
      spanish text,
      agrovoc text check (agrovoc ~ '^c_[0-9]+$'),
      source_note text,
      explainer_id uuid references explainers on delete set null,
      content_hash text,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    );
    create index terms_explainer on terms (explainer_id);

    create table hearings (
      term_id uuid not null references terms on delete cascade,
      episode_id uuid not null references episodes on delete cascade,
      at_ms integer not null check (at_ms >= 0),
      text text not null,
      primary key (term_id, episode_id, at_ms)
    );
    create index hearings_episode on hearings (episode_id);`)
}

export const down: Migration = async ({ context: { run } }) => {
  await run(`drop table hearings, terms, claims, sources, explainers`)
}
