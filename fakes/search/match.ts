import { slips } from './distance'
import type { Lexicon, Place } from './lexicon'
import type { Term } from './query'
import type { Settings } from './settings'

/** How one document answers one term. */
export type TermHit = { typos: number; exact: boolean; places: Place[] }
/** `marked`: how many letters of each word that was found are to be marked (a beginning marks only itself). */
export type TermHits = { hits: Map<number, TermHit>; marked: Map<string, number>; mostTypos: number }

type Scope = { attributes: Set<number> | null; settings: Settings }

/** Documented: no slip up to four letters, one from five, two from nine; the sizes are settings. */
export function slipsAllowed(word: string, { typoTolerance }: Settings): number {
  const { oneTypo, twoTypos } = typoTolerance.minWordSizeForTypos
  const off = typoTolerance.disableOnWords.includes(word) || (typoTolerance.disableOnNumbers && /^\d+$/.test(word))
  if (!typoTolerance.enabled || off) return 0
  if (word.length >= twoTypos) return 2
  return word.length >= oneTypo ? 1 : 0
}

function slipsTo(typed: string, word: string, most: number, prefix: boolean): number {
  // Documented: a slip in the first letter counts as two.
  const first = typed[0] === word[0] ? 0 : 1
  return most < 1 + first ? most + 1 : slips(typed, word, most, prefix) + first
}

function add(found: TermHits, lexicon: Lexicon, word: string, hit: Omit<TermHit, 'places'>, scope: Scope) {
  const strict = new Set(hit.typos > 0 ? scope.settings.typoTolerance.disableOnAttributes : [])
  for (const [number, all] of lexicon.words.get(word) ?? []) {
    const places = all.filter(
      ({ attribute }) =>
        (!scope.attributes || scope.attributes.has(attribute)) && !strict.has(lexicon.attributes[attribute] ?? ''),
    )
    if (places.length > 0) found.hits.set(number, joined(found.hits.get(number), { ...hit, places }))
  }
}

function joined(before: TermHit | undefined, hit: TermHit): TermHit {
  if (!before) return hit
  return {
    typos: Math.min(before.typos, hit.typos),
    exact: before.exact || hit.exact,
    places: [...before.places, ...hit.places],
  }
}

/** Documents in which the words stand in a row, with the places of the first word. */
export function inARow(lexicon: Lexicon, words: string[], scope: Scope): Map<number, Place[]> {
  const [first = '', ...rest] = words
  const found = new Map<number, Place[]>()
  for (const [number, places] of lexicon.words.get(first) ?? []) {
    const starts = places.filter(
      ({ attribute, position }) =>
        (!scope.attributes || scope.attributes.has(attribute)) &&
        rest.every((word, step) =>
          lexicon.words
            .get(word)
            ?.get(number)
            ?.some((place) => place.attribute === attribute && place.position === position + step + 1),
        ),
    )
    if (starts.length > 0) found.set(number, starts)
  }
  return found
}

function addRow(found: TermHits, lexicon: Lexicon, words: string[], exact: boolean, scope: Scope) {
  const rows = inARow(lexicon, words, scope)
  for (const [number, places] of rows) {
    found.hits.set(number, joined(found.hits.get(number), { typos: 0, exact, places }))
  }
  if (rows.size > 0) for (const word of words) found.marked.set(word, word.length)
}

/** Every document that answers the term: as typed, as a beginning, with slips, or by a synonym. */
export function findTerm(lexicon: Lexicon, term: Term, scope: Scope): TermHits {
  const [typed = ''] = term.words
  const found: TermHits = { hits: new Map(), marked: new Map(), mostTypos: 0 }
  if (term.words.length > 1) addRow(found, lexicon, term.words, true, scope)
  else {
    const most = slipsAllowed(typed, scope.settings)
    found.mostTypos = most
    for (const word of lexicon.words.keys()) {
      const begins = term.prefix && word.startsWith(typed)
      const typos = word === typed || begins ? 0 : slipsTo(typed, word, most, term.prefix)
      if (typos > most) continue
      add(found, lexicon, word, { typos, exact: word === typed }, scope)
      found.marked.set(word, begins ? typed.length : word.length)
    }
  }
  for (const synonym of term.synonyms) addRow(found, lexicon, synonym, false, scope)
  return found
}
