import { QueryTypes } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { db } from '@/lib/db'
import { documentsOfEpisodes, documentsOfExplainers, documentsOfQuestions, documentsOfTerms } from './document-reads'
import type { SearchDocument } from './document-rules'
import { foldedWords, type Narrowing } from './rules'
import { answersAll, fitsNarrowing, markedDocument } from './plain-rules'
import type { SearchItem, SearchQuery } from './schema'
import { searchItemView } from './views'
import { placesOf } from './visible-reads'

/** How many things are looked at; beyond that the plain search says that it is limited, and it is. */
const MOST_SOURCES = 60

/** Each finds ids of which a text holds a word that begins with one of the sought ones; the newest first. */
const candidates = {
  episodes: `select e.id from episodes e where e.state = 'published' and ($1 = '' or
      to_tsvector('simple', e.title || ' ' || coalesce(e.summary, '')) @@ to_tsquery('simple', $1)
      or exists (select from chapters c where c.episode_id = e.id
        and to_tsvector('simple', c.title) @@ to_tsquery('simple', $1))
      or exists (select from caption_tracks t join cues u on u.track_id = t.id where t.episode_id = e.id
        and to_tsvector('simple', u.plain) @@ to_tsquery('simple', $1)))
    order by e.published_at desc, e.id limit $2`,
  questions: `select q.id from questions q where q.state in ('new', 'queued', 'booked', 'answered') and ($1 = '' or
      to_tsvector('simple', q.title || ' ' || q.body) @@ to_tsquery('simple', $1))
    order by q.created_at desc, q.id limit $2`,
  terms: `select t.id from terms t where $1 = '' or to_tsvector('simple', t.label || ' ' || t.definition || ' ' ||
      array_to_string(t.synonyms || t.inflections, ' ')) @@ to_tsquery('simple', $1) order by t.label, t.id limit $2`,
  explainers: `select x.id from explainers x where $1 = '' or to_tsvector('simple', x.title || ' ' || x.summary || ' ' ||
      x.body) @@ to_tsquery('simple', $1) order by x.title, x.id limit $2`,
}

async function idsOf(table: keyof typeof candidates, words: readonly string[]): Promise<string[]> {
  // Folded words are letters and digits only, so none can be an operator of a tsquery.
  const anyOf = words.map((word) => `${word}:*`).join(' | ')
  const rows = await db().query<{ id: string }>(candidates[table], {
    bind: [anyOf, MOST_SOURCES],
    type: QueryTypes.SELECT,
  })
  return rows.map(({ id }) => id)
}

async function documentsWith(words: readonly string[]): Promise<SearchDocument[]> {
  const found = await Promise.all([
    idsOf('terms', words).then(documentsOfTerms),
    idsOf('episodes', words).then(documentsOfEpisodes),
    idsOf('questions', words).then(documentsOfQuestions),
    idsOf('explainers', words).then(documentsOfExplainers),
  ])
  return found.flat()
}

/**
 * The plain search straight from the database, for when the real one does not answer: every word must be there as
 * typed or as a beginning; no slips are forgiven and nothing is counted. Looks at the newest sixty of each kind.
 */
export async function searchDatabase(actor: Actor, query: SearchQuery): Promise<SearchItem[]> {
  const words = foldedWords(query.q)
  const narrowing: Narrowing = query
  const fitting = (await documentsWith(words))
    .filter((document) => fitsNarrowing(document, narrowing) && answersAll(document, words))
    .slice(0, query.limit)
  const places = await placesOf(
    actor,
    fitting.map(({ id }) => id),
  )
  return fitting.flatMap((document) => {
    const place = places.get(document.id)
    return place ? [searchItemView(markedDocument(document, words), place)] : []
  })
}
