import type { Migration } from './migrator'

/** People, how they prove who they are, and which channel they belong to. */
export const up: Migration = async ({ context: { run } }) => {
  await run(`
    create table users (
      id uuid primary key default gen_random_uuid(),
      email text not null check (email = lower(email)),
      name text not null,
      password_hash text,
      is_admin boolean not null default false,
      units text not null default 'us' check (units in ('us', 'metric')),
      language text not null default 'en',
      email_verified timestamptz,
      disabled_at timestamptz,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    );
    create unique index users_email on users (email);

    create table sessions (
      id uuid primary key default gen_random_uuid(),
      user_id uuid not null references users on delete cascade,
      created_at timestamptz not null default now(),
      expires_at timestamptz not null,
      ended_at timestamptz
    );
    create index sessions_user on sessions (user_id);

    create table verification_tokens (
      identifier text not null,
      token text not null,
      expires_at timestamptz not null,
      primary key (identifier, token)
    );

    create table api_tokens (
      id uuid primary key default gen_random_uuid(),
      user_id uuid not null references users on delete cascade,
      name text not null,
      token_hash text not null unique,
      created_at timestamptz not null default now(),
      last_used_at timestamptz,
      ended_at timestamptz
    );
    create index api_tokens_user on api_tokens (user_id);

    create table channels (
      id uuid primary key default gen_random_uuid(),
      slug text not null unique check (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
      name text not null,
      blurb text not null default '',
      time_zone text not null default 'UTC',
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    );

    create table memberships (
      channel_id uuid not null references channels on delete cascade,
      user_id uuid not null references users on delete cascade,
      role text not null check (role in ('owner', 'editor', 'adviser')),
      created_at timestamptz not null default now(),
      primary key (channel_id, user_id)
    );
    create index memberships_user on memberships (user_id);

    create table invitations (
      id uuid primary key default gen_random_uuid(),
      channel_id uuid not null references channels on delete cascade,
      email text not null check (email = lower(email)),
      role text not null check (role in ('owner', 'editor', 'adviser')),
      token_hash text not null unique,
      invited_by uuid references users on delete set null,
      expires_at timestamptz not null,
      accepted_at timestamptz,
      created_at timestamptz not null default now()
    );
    create unique index invitations_open on invitations (channel_id, email) where accepted_at is null;
    create index invitations_by on invitations (invited_by);

    create table throttles (
      key text primary key,
      count integer not null,
      opened_at timestamptz not null
    );

    create table idempotency_keys (
      user_id uuid not null references users on delete cascade,
      key text not null,
      request_hash text not null,
      status integer,
      headers jsonb,
      body jsonb,
      created_at timestamptz not null default now(),
      primary key (user_id, key)
    );`)
}

export const down: Migration = async ({ context: { run } }) => {
  await run(`drop table idempotency_keys, throttles, invitations, memberships, channels, api_tokens, verification_tokens,
    sessions, users`)
}
