import type { TermForms } from './entries'

/** One thing that a form can mean. `spelling` is set for abbreviations, which count only as written. */
export type Meaning = {
  term: TermForms
  near: Set<string>
  notNear: Set<string>
  after: Set<string>
  spelling: string | null
}

/** A step of the trie: the words that may follow, and what a form that ends here can mean. */
export type FormNode = { next: Map<string, FormNode>; meanings: Meaning[] }

export type Word = { word: string; from: number; to: number }

const wordPattern = /[\p{L}\p{N}][\p{L}\p{M}\p{N}]*/gu

/** Case and composed or decomposed accents make no difference to which word it is. */
export const fold = (text: string) => text.normalize('NFC').toLowerCase()

/** The words of a text with their offsets. A hyphen parts words: "no-till" is two, as is "no till". */
export function wordsOf(text: string): Word[] {
  return Array.from(text.matchAll(wordPattern), ({ 0: found, index }) => ({
    word: fold(found),
    from: index,
    to: index + found.length,
  }))
}

/** FC, PTO, GDD: two letters or more, all of them capitals. */
const isAbbreviation = (form: string) => /^\p{Lu}{2,}$/u.test(form)

function plural(form: string): string {
  if (isAbbreviation(form)) return `${form}s`
  if (/[^aeiou]y$/i.test(form)) return `${form.slice(0, -1)}ies`
  return /(s|x|z|ch|sh)$/i.test(form) ? `${form}es` : `${form}s`
}

/** Everything a term is called, with regular plurals. Other inflections stand in the entry. */
export function formsOf(term: TermForms): string[] {
  const names = [term.label, ...term.synonyms, ...term.regional.map(({ name }) => name)]
  return [...new Set([...names.flatMap((name) => [name, plural(name)]), ...term.inflections])]
}

function addForm(root: FormNode, form: string, meaning: Meaning) {
  let node = root
  for (const { word } of wordsOf(form)) {
    const next = node.next.get(word) ?? { next: new Map(), meanings: [] }
    node.next.set(word, next)
    node = next
  }
  if (node !== root) node.meanings.push(meaning)
}

/** A trie over the words of all forms. Where several terms share a form, the ones that name a context are asked first. */
export function indexTerms(terms: readonly TermForms[]): FormNode {
  const root: FormNode = { next: new Map(), meanings: [] }
  const particularFirst = [...terms.filter((term) => term.context), ...terms.filter((term) => !term.context)]
  for (const term of particularFirst) {
    const near = new Set(term.context?.near?.map(fold))
    const notNear = new Set(term.context?.notNear?.map(fold))
    const after = new Set(term.context?.after?.map(fold))
    for (const form of formsOf(term)) {
      const spelling = isAbbreviation(form.replace(/s$/, '')) ? form.normalize('NFC') : null
      addForm(root, form, { term, near, notNear, after, spelling })
    }
  }
  return root
}
