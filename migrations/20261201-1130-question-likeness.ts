import type { Migration } from './migrator'

/**
 * What finds questions in other words: shared letters (trigrams) and shared stems. pg_trgm is a trusted extension, so
 * the owner of the database may create it without being a superuser.
 */
export const up: Migration = async ({ context: { run } }) => {
  await run(`
    create extension if not exists pg_trgm;
    create index questions_title_letters on questions using gin (title gin_trgm_ops);
    create index questions_stems on questions using gin (to_tsvector('english', title || ' ' || body));`)
}

/** The extension stays: somebody else may use it. */
export const down: Migration = async ({ context: { run } }) => {
  await run('drop index questions_stems, questions_title_letters')
}
