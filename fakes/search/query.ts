import type { Settings } from './settings'
import { folded, tokens } from './words'

/** One thing asked for: a word, or words in a row. `prefix` when a longer word that begins so counts as well. */
export type Term = { words: string[]; prefix: boolean; synonyms: string[][] }
export type Query = { terms: Term[]; without: string[][] }

/** Documented: only the first ten words of a query are looked at. */
const MOST_TERMS = 10
const LONGEST_SYNONYM = 3

const wordsOf = (text: string) => tokens(text).map(({ word }) => word)

function synonymTable(settings: Settings): Map<string, string[][]> {
  const entries = Object.entries(settings.synonyms)
  return new Map(entries.map(([key, others]) => [wordsOf(key).join(' '), others.map(wordsOf)]))
}

/** Synonyms of a run of words are put on each word of the run, so that either way of saying it answers all of them. */
function addSynonyms(terms: Term[], settings: Settings) {
  const table = synonymTable(settings)
  for (let from = 0; from < terms.length; from++) {
    for (let length = 1; length <= LONGEST_SYNONYM && from + length <= terms.length; length++) {
      const run = terms.slice(from, from + length)
      const others = table.get(run.map(({ words }) => words.join(' ')).join(' ')) ?? []
      for (const term of run) term.synonyms.push(...others)
    }
  }
}

/**
 * Reads a query: words, `"words in a row"`, and `-word` or `-"in a row"` for what must not be there. The last word is
 * a beginning unless something follows it. Stop words are not looked for, except a last one that is still being typed.
 */
export function readQuery(text: string, settings: Settings): Query {
  const query: Query = { terms: [], without: [] }
  const stops = new Set(settings.stopWords.map(folded))
  for (const part of text.matchAll(/(-?)"([^"]*)"?|([^\s"]+)/g)) {
    const bare = part[3] ?? ''
    const minus = part[1] === '-' || (bare.startsWith('-') && /^\s?$/.test(text[part.index - 1] ?? ''))
    const words = wordsOf(part[2] ?? bare)
    if (words.length === 0) continue
    if (minus) query.without.push(words)
    else if (part[2] !== undefined) query.terms.push({ words, prefix: false, synonyms: [] })
    else query.terms.push(...words.map((word) => ({ words: [word], prefix: false, synonyms: [] })))
  }
  const last = query.terms.at(-1)
  if (last?.words.length === 1 && /[\p{L}\p{N}\p{M}]$/u.test(text)) last.prefix = true
  query.terms = query.terms
    .filter(({ words, prefix }) => prefix || words.length > 1 || !stops.has(words[0] ?? ''))
    .slice(0, MOST_TERMS)
  addSynonyms(query.terms, settings)
  return query
}
