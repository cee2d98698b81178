import type { Migration } from './migrator'

/** The outbox: a letter is a row of the transaction that causes it, and its key makes it the only one. */
export const up: Migration = async ({ context: { run } }) => {
  await run(`
    create table letters (
      id uuid primary key default gen_random_uuid(),
      key text not null unique,
      to_address text not null,
      to_name text,
      subject text not null,
      text text not null,
      html text,
      headers jsonb not null default '{}',
      state text not null default 'waiting' check (state in ('waiting', 'sent', 'failed')),
      attempts integer not null default 0,
      last_error text,
      sent_at timestamptz,
      created_at timestamptz not null default now()
    );
    create index letters_waiting on letters (created_at) where state = 'waiting';

    create table marks (
      key text primary key,
      value jsonb not null,
      set_at timestamptz not null default now()
    );`)
}

export const down: Migration = async ({ context: { run } }) => {
  await run(`drop table marks, letters`)
}
