import { MeilisearchError, type MultiSearchQuery } from 'meilisearch'
import type { Actor } from '@/lib/auth/actor'
import { unavailable } from '@/lib/errors'
import { decodeCursor, encodeCursor } from '@/lib/http/paging'
import { log } from '@/lib/log'
import { services } from '@/lib/services'
import { Term } from '@/models/term'
import type { SearchDocument } from './document-rules'
import { INDEX } from './index-settings'
import { conditionsOf, facetAttributes, MARK_CLOSE, MARK_OPEN, type Narrowing, nearestNames } from './rules'
import type { FacetName, SearchQuery, SearchResult } from './schema'
import { type FoundDocument, searchItemView } from './views'
import { placesOf } from './visible-reads'

export const facetNames = Object.keys(facetAttributes) as FacetName[]

const offsetOf = (cursor: string | undefined): number => {
  const [offset] = cursor ? decodeCursor(cursor, 1) : [0]
  return typeof offset === 'number' && Number.isSafeInteger(offset) && offset >= 0 ? offset : 0
}

const base = (query: SearchQuery): MultiSearchQuery => ({
  indexUid: INDEX,
  q: query.q,
  filter: conditionsOf(query),
  facets: Object.values(facetAttributes),
  offset: offsetOf(query.cursor),
  limit: query.limit + 1,
  attributesToHighlight: ['spoken', 'text'],
  attributesToCrop: ['text:36'],
  highlightPreTag: MARK_OPEN,
  highlightPostTag: MARK_CLOSE,
})

/** A choice already made is counted as if it were open, so that its neighbours can be chosen instead. */
const withOpenChoice = (query: SearchQuery, name: FacetName): MultiSearchQuery => ({
  indexUid: INDEX,
  q: query.q,
  filter: conditionsOf(query, name),
  facets: [facetAttributes[name]],
  limit: 0,
})

async function ask(queries: MultiSearchQuery[]) {
  try {
    const asked = services().search.multiSearch<{ queries: MultiSearchQuery[] }, SearchDocument>({ queries })
    return (await asked).results
  } catch (failure) {
    // Down, slow, broken, without its index or with another key: for a reader it is all the same.
    if (!(failure instanceof MeilisearchError)) throw failure
    log.warn({ err: failure }, 'search does not answer')
    throw unavailable('Search')
  }
}

type Hit = SearchDocument & { _formatted?: Partial<SearchDocument> }

const foundIn = ({ _formatted: marked, ...hit }: Hit): FoundDocument => ({
  ...hit,
  spoken: marked?.spoken ?? hit.spoken,
  text: marked?.text ?? hit.text,
})

/**
 * What everybody may see of what was asked for, best first. What the database does not show to this actor now is left
 * out, however the index lags.
 * @throws Problem 503 when the search does not answer, 400 for a cursor that is not ours
 */
export async function searchEverything(actor: Actor, query: SearchQuery): Promise<SearchResult> {
  const started = performance.now()
  const chosen = facetNames.filter((name) => query[name as keyof Narrowing] !== undefined)
  const [found, ...open] = await ask([base(query), ...chosen.map((name) => withOpenChoice(query, name))])
  const hits = (found?.hits ?? []) as Hit[]
  const shown = hits.slice(0, query.limit)
  const places = await placesOf(
    actor,
    shown.map(({ id }) => id),
  )
  const counts = (name: FacetName) => {
    const from = open[chosen.indexOf(name)] ?? found
    return from?.facetDistribution?.[facetAttributes[name]] ?? {}
  }
  return {
    items: shown.flatMap((hit) => {
      const place = places.get(hit.id)
      return place ? [searchItemView(foundIn(hit), place)] : []
    }),
    facets: Object.fromEntries(facetNames.map((name) => [name, counts(name)])) as SearchResult['facets'],
    total: Math.max(0, (found?.estimatedTotalHits ?? 0) - shown.filter(({ id }) => !places.has(id)).length),
    nextCursor: hits.length > query.limit ? encodeCursor([offsetOf(query.cursor) + query.limit]) : null,
    elapsedMs: Math.round(performance.now() - started),
  }
}

export type NearTerm = { label: string; url: string }

/** Terms of the handbook whose names look like what was typed; for when nothing was found. */
export async function nearestTerms(typed: string, most = 4): Promise<NearTerm[]> {
  const rows = await Term.findAll({ attributes: ['slug', 'label', 'synonyms'] })
  const known = rows.map(({ slug, label, synonyms }) => ({ slug, label, names: [label, ...synonyms] }))
  return nearestNames(typed, known, most).map(({ slug, label }) => ({ label, url: `/handbook/terms/${slug}` }))
}
