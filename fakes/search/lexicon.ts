import type { Doc, Index } from './shapes'
import { FAR, textsOf, tokens, valueAt } from './words'

/** Where a word stands: which searchable attribute (0 is the most important) and how far into it. */
export type Place = { attribute: number; position: number }

/** Every word of an index and where it stands, by the document's place in `documents`. */
export type Lexicon = {
  documents: Doc[]
  attributes: string[]
  words: Map<string, Map<number, Place[]>>
  /** Folded words of each attribute of each document, to tell whether a query is all of it. */
  wholes: Map<string, Set<number>>
}

function searchable(index: Index, documents: Doc[]): string[] {
  const wanted = index.settings.searchableAttributes
  if (!wanted.includes('*')) return wanted
  return [...new Set(documents.flatMap((document) => Object.keys(document)))]
}

function read(lexicon: Lexicon, number: number, attribute: number, texts: string[]) {
  let position = 0
  for (const text of texts) {
    const found = tokens(text, position)
    for (const { word, position: at } of found) {
      const documents = lexicon.words.get(word) ?? new Map<number, Place[]>()
      lexicon.words.set(word, documents)
      const places = documents.get(number) ?? []
      documents.set(number, places)
      places.push({ attribute, position: at })
    }
    const whole = found.map(({ word }) => word).join(' ')
    lexicon.wholes.set(whole, (lexicon.wholes.get(whole) ?? new Set()).add(number))
    position = (found.at(-1)?.position ?? position) + FAR
  }
}

/** Reads the whole index into a lexicon; kept until the next write. */
export function lexiconOf(index: Index): Lexicon {
  if (index.lexicon) return index.lexicon
  const documents = [...index.documents.values()]
  const lexicon: Lexicon = {
    documents,
    attributes: searchable(index, documents),
    words: new Map(),
    wholes: new Map(),
  }
  documents.forEach((document, number) => {
    lexicon.attributes.forEach((name, attribute) => read(lexicon, number, attribute, textsOf(valueAt(document, name))))
  })
  index.lexicon = lexicon
  return lexicon
}
