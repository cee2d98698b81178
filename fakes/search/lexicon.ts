import type { Doc, Index } from './shapes'
import { FAR, textsOf, tokens, valueAt } from './words'

/** Where a word stands: which searchable attribute (0 is the most important) and how far into it. */
export type Place = { attribute: number; position: number }

/** Every word of an index and where it stands, by the number of the document. Changes with the documents one by one. */
export type Lexicon = {
  documents: Map<number, Doc>
  attributes: string[]
  words: Map<string, Map<number, Place[]>>
  /** The folded words of whole attributes, to tell whether a query is all of one. */
  wholes: Map<string, Set<number>>
  numbers: Map<string, number>
  nextNumber: number
  /** What of the two tables above a document has put there. */
  entries: Map<number, { words: Set<string>; wholes: Set<string> }>
}

function readText(lexicon: Lexicon, number: number, attribute: number, text: string, from: number): number {
  const found = tokens(text, from)
  const entry = lexicon.entries.get(number)
  for (const { word, position } of found) {
    let documents = lexicon.words.get(word)
    if (!documents) lexicon.words.set(word, (documents = new Map()))
    const places = documents.get(number)
    if (places) places.push({ attribute, position })
    else documents.set(number, [{ attribute, position }])
    entry?.words.add(word)
  }
  const whole = found.map(({ word }) => word).join(' ')
  lexicon.wholes.set(whole, (lexicon.wholes.get(whole) ?? new Set()).add(number))
  entry?.wholes.add(whole)
  return (found.at(-1)?.position ?? from) + FAR
}

/** Takes out what a document has put in; its number stays its own. */
export function forgetDocument(lexicon: Lexicon, key: string) {
  const number = lexicon.numbers.get(key) ?? -1
  const entry = lexicon.entries.get(number)
  for (const word of entry?.words ?? []) {
    const documents = lexicon.words.get(word)
    documents?.delete(number)
    if (documents?.size === 0) lexicon.words.delete(word)
  }
  for (const whole of entry?.wholes ?? []) {
    const documents = lexicon.wholes.get(whole)
    documents?.delete(number)
    if (documents?.size === 0) lexicon.wholes.delete(whole)
  }
  lexicon.entries.delete(number)
  lexicon.documents.delete(number)
}

/** Puts a document in, or in place of the one that had its key. */
export function rememberDocument(lexicon: Lexicon, index: Index, key: string, document: Doc) {
  forgetDocument(lexicon, key)
  const number = lexicon.numbers.get(key) ?? lexicon.nextNumber++
  lexicon.numbers.set(key, number)
  lexicon.documents.set(number, document)
  lexicon.entries.set(number, { words: new Set(), wholes: new Set() })
  if (index.settings.searchableAttributes.includes('*')) {
    for (const name of Object.keys(document)) if (!lexicon.attributes.includes(name)) lexicon.attributes.push(name)
  }
  lexicon.attributes.forEach((name, attribute) => {
    let position = 0
    for (const text of textsOf(valueAt(document, name))) {
      position = readText(lexicon, number, attribute, text, position)
    }
  })
}

/** The lexicon of an index, read whole where there is none: after a start, and after a change of settings. */
export function lexiconOf(index: Index): Lexicon {
  if (index.lexicon) return index.lexicon
  const wanted = index.settings.searchableAttributes
  const lexicon: Lexicon = {
    documents: new Map(),
    attributes: wanted.includes('*') ? [] : [...wanted],
    words: new Map(),
    wholes: new Map(),
    numbers: new Map(),
    nextNumber: 0,
    entries: new Map(),
  }
  for (const [key, document] of index.documents) rememberDocument(lexicon, index, key, document)
  index.lexicon = lexicon
  return lexicon
}
