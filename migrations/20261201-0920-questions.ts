import type { Migration } from './migrator'

/** Viewers' questions, who else is asking, what was done with them, and the range of a later episode that answers. */
export const up: Migration = async ({ context: { run } }) => {
  await run(`
    create table questions (
      id uuid primary key default gen_random_uuid(),
      channel_id uuid not null references channels on delete cascade,
      asker_id uuid references users on delete set null,
      title text not null check (char_length(title) between 1 and 160),
      body text not null default '',
      episode_id uuid,
      at_ms integer check (at_ms >= 0),
      crop text,
      stage text,
      state text not null default 'new'
        check (state in ('new', 'queued', 'booked', 'answered', 'set-aside', 'joined')),
      set_aside_reason text,
      joined_into uuid,
      booked_episode_id uuid,
      answered_at timestamptz,
      edition integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      unique (id, channel_id),
      foreign key (episode_id, channel_id) references episodes (id, channel_id),
      foreign key (booked_episode_id, channel_id) references episodes (id, channel_id),
      foreign key (joined_into, channel_id) references questions (id, channel_id),
      check (at_ms is null or episode_id is not null),
      check ((state = 'set-aside') = (set_aside_reason is not null)),
      check ((state = 'joined') = (joined_into is not null)),
      check (state <> 'booked' or booked_episode_id is not null),
      check ((state = 'answered') = (answered_at is not null))
    );
    create index questions_channel on questions (channel_id, state, created_at desc, id);
    create index questions_newest on questions (created_at desc, id);
    create index questions_episode on questions (episode_id, at_ms);
    create index questions_booked on questions (booked_episode_id);
    create index questions_joined on questions (joined_into);
    create index questions_asker on questions (asker_id);

    create table askings (
      question_id uuid not null references questions on delete cascade,
      user_id uuid not null references users on delete cascade,
      created_at timestamptz not null default now(),
      primary key (question_id, user_id)
    );
    create index askings_user on askings (user_id);

    create table question_photos (
      id uuid primary key default gen_random_uuid(),
      question_id uuid not null references questions on delete cascade,
      name text not null unique,
      width integer not null,
      height integer not null,
      alt text not null default '',
      created_at timestamptz not null default now()
    );
    create index question_photos_question on question_photos (question_id);

    create table answers (
      id uuid primary key default gen_random_uuid(),
      question_id uuid not null unique references questions on delete cascade,
      episode_id uuid not null references episodes on delete cascade,
      start_ms integer not null check (start_ms >= 0),
      end_ms integer not null,
      text text not null,
      written_by uuid references users on delete set null,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      check (end_ms > start_ms)
    );
    create index answers_episode on answers (episode_id, start_ms);
    create index answers_by on answers (written_by);

    create table question_events (
      id uuid primary key default gen_random_uuid(),
      question_id uuid not null references questions on delete cascade,
      actor_id uuid references users on delete set null,
      move text not null,
      from_state text,
      to_state text not null,
      detail text,
      created_at timestamptz not null default now()
    );
    create index question_events_question on question_events (question_id, created_at);
    create index question_events_actor on question_events (actor_id);

    create table verdicts (
      question_id uuid not null references questions on delete cascade,
      user_id uuid not null references users on delete cascade,
      settled boolean not null,
      note text,
      created_at timestamptz not null default now(),
      primary key (question_id, user_id)
    );
    create index verdicts_user on verdicts (user_id);`)
}

export const down: Migration = async ({ context: { run } }) => {
  await run(`drop table verdicts, question_events, answers, question_photos, askings, questions`)
}
