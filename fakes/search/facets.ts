import { badRequest } from './errors'
import { covers } from './filter-match'
import type { Result } from './find'
import type { Index } from './shapes'
import { textsOf, valueAt } from './words'

type Facets = {
  facetDistribution: Record<string, Record<string, number>>
  facetStats: Record<string, { min: number; max: number }>
}

function counts(results: Result[], name: string): Map<string, number> {
  const found = new Map<string, number>()
  for (const { document } of results) {
    // A document counts once under each of its values.
    for (const text of new Set(textsOf(valueAt(document, name)))) found.set(text, (found.get(text) ?? 0) + 1)
  }
  return found
}

function numbers(results: Result[], name: string): number[] {
  return results
    .flatMap(({ document }) => [valueAt(document, name)].flat())
    .filter((value): value is number => typeof value === 'number')
}

/** How many of all that was found have each value of each facet. Throws 400 `invalid_search_facets`. */
export function facetsOf(index: Index, results: Result[], wanted: string[]): Facets {
  const { filterableAttributes, faceting } = index.settings
  const names = wanted.includes('*') ? filterableAttributes : wanted
  const unknown = names.find((name) => !covers(filterableAttributes, name))
  if (unknown !== undefined) throw badRequest(`Attribute \`${unknown}\` is not filterable.`, 'invalid_search_facets')
  const facets: Facets = { facetDistribution: {}, facetStats: {} }
  for (const name of names) {
    const order = faceting.sortFacetValuesBy[name] ?? faceting.sortFacetValuesBy['*'] ?? 'alpha'
    const entries = [...counts(results, name)].sort(
      ([left, a], [right, b]) => (order === 'count' ? b - a : 0) || (left < right ? -1 : 1),
    )
    facets.facetDistribution[name] = Object.fromEntries(entries.slice(0, faceting.maxValuesPerFacet))
    const values = numbers(results, name)
    if (values.length > 0) facets.facetStats[name] = { min: Math.min(...values), max: Math.max(...values) }
  }
  return facets
}
