import { filterTest } from './filter-match'
import { lexiconOf, type Lexicon } from './lexicon'
import { findTerm, inARow, type TermHit, type TermHits } from './match'
import { byRules, sortOrder } from './order'
import { readQuery } from './query'
import { effectiveRules, ranked, scoreOf, type Found } from './rank'
import type { SearchInput } from './search-input'
import type { Doc, Index } from './shapes'

export type Result = { document: Doc; score: number }
/** Every document found, best first, and the words that are to be marked in them. */
export type Findings = { results: Result[]; marked: Map<string, number> }

/** `last` gives up words from the end, `frequency` the commonest words first, `all` none. Answers the order to keep. */
function inOrderKept(terms: TermHits[], strategy: SearchInput['matchingStrategy']): TermHits[] {
  if (strategy !== 'frequency') return terms
  return [...terms].sort((left, right) => left.hits.size - right.hits.size)
}

function candidates(lexicon: Lexicon, terms: TermHits[], all: boolean): Omit<Found, 'steps'>[] {
  const numbers = terms.length === 0 ? lexicon.documents.keys() : (terms[0]?.hits.keys() ?? [])
  return [...numbers]
    .map((number) => {
      const hits: TermHit[] = []
      for (const term of terms) {
        const hit = term.hits.get(number)
        if (!hit) break
        hits.push(hit)
      }
      return { number, hits }
    })
    .filter(({ hits }) => !all || hits.length === terms.length)
}

function distinctOnly(results: Result[], attribute: string | null): Result[] {
  if (!attribute) return results
  const seen = new Set<string>()
  return results.filter(({ document }) => {
    const value = JSON.stringify(document[attribute])
    if (document[attribute] === undefined || !seen.has(value)) return seen.add(value)
    return false
  })
}

/** Finds, filters and orders. Nothing is cut off here: facets count all that was found. */
export function find(index: Index, input: SearchInput): Findings {
  const lexicon = lexiconOf(index)
  const names = input.attributesToSearchOn
  const attributes = names ? new Set(names.map((name) => lexicon.attributes.indexOf(name))) : null
  const scope = { attributes, settings: index.settings }
  const query = readQuery(input.q ?? '', index.settings)
  const terms = inOrderKept(
    query.terms.map((term) => findTerm(lexicon, term, scope)),
    input.matchingStrategy,
  )
  const refused = new Set(query.without.flatMap((words) => [...inARow(lexicon, words, scope).keys()]))
  const passes = filterTest(index, input.filter)
  const rules = effectiveRules(index.settings.rankingRules)
  const whole = { terms, lexicon, text: query.terms.map(({ words }) => words.join(' ')).join(' ') }
  const found = candidates(lexicon, terms, input.matchingStrategy === 'all')
    .filter(({ number }) => !refused.has(number) && passes(lexicon.documents.get(number) ?? {}))
    .map((each) => ranked(each, whole))
    .sort(byRules(lexicon.documents, rules, sortOrder(index, input.sort ?? [])))
    .map((each) => ({ document: lexicon.documents.get(each.number) ?? {}, score: scoreOf(each, rules) }))
    .filter(({ score }) => score >= (input.rankingScoreThreshold ?? 0))
  return {
    results: distinctOnly(found, input.distinct ?? index.settings.distinctAttribute),
    marked: new Map(terms.flatMap((term) => [...term.marked])),
  }
}
