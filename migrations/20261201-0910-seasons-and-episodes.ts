import type { Migration } from './migrator'

/** A channel's crop years, its episodes, and all that is pinned to a time of an episode. */
export const up: Migration = async ({ context: { run } }) => {
  await run(`
    create table seasons (
      id uuid primary key default gen_random_uuid(),
      channel_id uuid not null references channels on delete cascade,
      year integer not null check (year between 1900 and 2200),
      edition integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      unique (channel_id, year),
      unique (id, channel_id)
    );

    create table plantings (
      id uuid primary key default gen_random_uuid(),
      season_id uuid not null references seasons on delete cascade,
      crop text not null,
      field text not null,
      area_acres double precision check (area_acres > 0),
      planted_on date,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      unique (season_id, crop, field)
    );

    create table stage_windows (
      id uuid primary key default gen_random_uuid(),
      planting_id uuid not null references plantings on delete cascade,
      stage text not null check (stage in ('soil', '0', '1', '2', '3', '4', '5', '6', '7', '8', '9')),
      starts_on date not null,
      ends_on date not null,
      check (starts_on <= ends_on)
    );
    create index stage_windows_planting on stage_windows (planting_id);

    create table episodes (
      id uuid primary key default gen_random_uuid(),
      channel_id uuid not null references channels on delete cascade,
      season_id uuid,
      number integer not null check (number > 0),
      slug text not null,
      title text not null,
      summary text,
      language text not null default 'en',
      filmed_on date,
      state text not null default 'draft' check (state in ('draft', 'scheduled', 'published', 'withdrawn')),
      publish_at timestamptz,
      published_at timestamptz,
      withdrawn_at timestamptz,
      cautions_confirmed_at timestamptz,
      cautions_confirmed_by uuid references users on delete set null,
      footage_id uuid,
      edition integer not null default 1,
      created_by uuid references users on delete set null,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      unique (channel_id, number),
      unique (channel_id, slug),
      unique (id, channel_id),
      foreign key (season_id, channel_id) references seasons (id, channel_id),
      check (state <> 'scheduled' or publish_at is not null),
      check (state <> 'published' or published_at is not null)
    );
    create index episodes_season on episodes (season_id, channel_id);
    create index episodes_created_by on episodes (created_by);
    create index episodes_cautions_by on episodes (cautions_confirmed_by);
    create index episodes_published on episodes (channel_id, published_at desc) where state = 'published';
    create index episodes_due on episodes (publish_at) where state = 'scheduled';

    create table footages (
      id uuid primary key,
      episode_id uuid not null references episodes on delete cascade,
      uploaded_by uuid references users on delete set null,
      filename text not null,
      filetype text,
      bytes bigint not null check (bytes >= 0),
      state text not null default 'receiving' check (state in ('receiving', 'inspecting', 'encoding', 'ready', 'failed')),
      step text,
      progress double precision not null default 0 check (progress between 0 and 1),
      error_code text,
      error_detail text,
      film jsonb,
      duration_ms integer check (duration_ms > 0),
      folder text unique,
      attempt integer not null default 0,
      expires_at timestamptz,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      check (state <> 'ready' or (folder is not null and duration_ms is not null)),
      check (state <> 'failed' or error_code is not null)
    );
    create index footages_episode on footages (episode_id, created_at desc);
    create index footages_uploaded_by on footages (uploaded_by);
    alter table episodes add foreign key (footage_id) references footages on delete set null;
    create index episodes_footage on episodes (footage_id);

    create table renditions (
      footage_id uuid not null references footages on delete cascade,
      height integer not null,
      width integer not null default 0,
      bitrate integer not null default 0,
      bytes bigint not null default 0,
      ready boolean not null default false,
      primary key (footage_id, height)
    );

    create table chapters (
      id uuid primary key default gen_random_uuid(),
      episode_id uuid not null references episodes on delete cascade,
      start_ms integer not null check (start_ms >= 0),
      title text not null check (char_length(title) between 1 and 60),
      unique (episode_id, start_ms)
    );

    create table chapter_topics (
      chapter_id uuid not null references chapters on delete cascade,
      code text not null,
      primary key (chapter_id, code)
    );
    create index chapter_topics_code on chapter_topics (code);

    create table caption_tracks (
      id uuid primary key default gen_random_uuid(),
      episode_id uuid not null references episodes on delete cascade,
      language text not null,
      kind text not null default 'captions' check (kind in ('captions', 'subtitles', 'descriptions')),
      label text not null,
      checked boolean not null default true,
      edition integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      unique (episode_id, language)
    );

    create table cues (
      id uuid primary key default gen_random_uuid(),
      track_id uuid not null references caption_tracks on delete cascade,
      start_ms integer not null check (start_ms >= 0),
      end_ms integer not null,
      text text not null,
      plain text not null,
      speaker text,
      settings text,
      check (end_ms > start_ms)
    );
    create index cues_track on cues (track_id, start_ms);

    create table readings (
      id uuid primary key default gen_random_uuid(),
      episode_id uuid not null references episodes on delete cascade,
      at_ms integer not null check (at_ms >= 0),
      quantity text not null,
      value double precision not null,
      unit text not null,
      note text
    );
    create index readings_episode on readings (episode_id, at_ms);

    create table corrections (
      id uuid primary key default gen_random_uuid(),
      episode_id uuid not null references episodes on delete cascade,
      at_ms integer not null check (at_ms >= 0),
      said text not null,
      amended text not null,
      created_by uuid references users on delete set null,
      created_at timestamptz not null default now()
    );
    create index corrections_episode on corrections (episode_id, at_ms);
    create index corrections_by on corrections (created_by);`)
}

export const down: Migration = async ({ context: { run } }) => {
  await run(`
    alter table episodes drop constraint episodes_footage_id_fkey;
    drop table corrections, readings, cues, caption_tracks, chapter_topics, chapters, renditions, footages, episodes,
      stage_windows, plantings, seasons`)
}
