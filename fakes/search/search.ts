import { facetsOf } from './facets'
import { find, type Findings, type Result } from './find'
import { formatted, matchesPosition } from './format'
import { searchInput, type SearchInput } from './search-input'
import type { Doc, Index, Json } from './shapes'

const pick = (document: Doc, names: string[]): Doc =>
  names.includes('*') ? document : Object.fromEntries(Object.entries(document).filter(([name]) => names.includes(name)))

function hit(index: Index, { document, score }: Result, { marked }: Findings, input: SearchInput): Doc {
  const shown = pick(document, index.settings.displayedAttributes)
  const formats = [...(input.attributesToHighlight ?? []), ...(input.attributesToCrop ?? [])]
  const plain = pick(shown, input.attributesToRetrieve)
  const wide = pick(shown, [...input.attributesToRetrieve, ...formats.map((name) => name.split(':')[0] ?? '')])
  return {
    ...plain,
    ...(formats.length > 0 ? { _formatted: formatted(wide, marked, input) } : {}),
    ...(input.showMatchesPosition ? { _matchesPosition: matchesPosition(wide, marked) } : {}),
    ...(input.showRankingScore ? { _rankingScore: score } : {}),
  }
}

type Page = { from: number; count: number; facts: Doc }

/** Either `offset` and `limit` with an estimate, or numbered pages with a count; never past `maxTotalHits`. */
function pageOf(input: SearchInput, total: number): Page {
  if (input.page === undefined && input.hitsPerPage === undefined) {
    const { offset, limit } = input
    return { from: offset, count: limit, facts: { offset, limit, estimatedTotalHits: total } }
  }
  const [page, hitsPerPage] = [input.page ?? 1, input.hitsPerPage ?? 20]
  const totalPages = hitsPerPage === 0 ? 0 : Math.ceil(total / hitsPerPage)
  const count = page === 0 ? 0 : hitsPerPage
  return {
    from: Math.max(0, page - 1) * hitsPerPage,
    count,
    facts: { page, hitsPerPage, totalPages, totalHits: total },
  }
}

/** Answers one search. Throws 400 for what cannot be read or is not filterable, sortable or a facet. */
export function search(index: Index, body: unknown): { [key: string]: Json } {
  const started = performance.now()
  const input = searchInput(body)
  const findings = find(index, input)
  const within = findings.results.slice(0, index.settings.pagination.maxTotalHits)
  const { from, count, facts } = pageOf(input, within.length)
  return {
    hits: within.slice(from, from + count).map((result) => hit(index, result, findings, input)),
    query: input.q ?? '',
    ...(input.facets ? facetsOf(index, findings.results, input.facets) : {}),
    ...facts,
    processingTimeMs: Math.round(performance.now() - started),
  }
}
