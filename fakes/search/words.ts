import type { Json } from './shapes'

/** A word of a text: `word` as compared, `start`/`end` as character offsets of the text, `position` for nearness. */
export type Token = { word: string; start: number; end: number; position: number }

/** Documented: words on either side of a full stop, or in different values, count as eight apart. */
export const FAR = 8

/** Case and accents do not count when words are compared. */
export function folded(word: string): string {
  // Most words are plain letters, and taking a text apart is costly.
  if (/^[a-z0-9]*$/i.test(word)) return word.toLowerCase()
  return word
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .toLowerCase()
}

/** The words of a text. Anything but letters, digits and marks stands between words. */
export function tokens(text: string, firstPosition = 0): Token[] {
  const found: Token[] = []
  let position = firstPosition
  let before = 0
  for (const match of text.matchAll(/[\p{L}\p{N}\p{M}]+/gu)) {
    const start = match.index
    if (found.length > 0) position += /[.!?;,:()[\]{}|\n]/.test(text.slice(before, start)) ? FAR : 1
    before = start + match[0].length
    const word = folded(match[0])
    if (word) found.push({ word, start, end: before, position })
  }
  return found
}

/** Every text inside a value, in order: an array's items and an object's fields count one by one. */
export function textsOf(value: Json | undefined): string[] {
  if (value === null || value === undefined) return []
  if (Array.isArray(value)) return value.flatMap(textsOf)
  if (typeof value === 'object') return Object.values(value).flatMap(textsOf)
  return [String(value)]
}

/** The value at `a.b.c`, looking through arrays of objects on the way. */
export function valueAt(value: Json | undefined, path: string): Json | undefined {
  if (value === null || typeof value !== 'object') return undefined
  if (Array.isArray(value)) {
    const found = value.map((item) => valueAt(item, path)).filter((item) => item !== undefined)
    return found.length > 0 ? found.flat() : undefined
  }
  if (Object.hasOwn(value, path)) return value[path]
  const [head = '', ...rest] = path.split('.')
  return rest.length > 0 && Object.hasOwn(value, head) ? valueAt(value[head], rest.join('.')) : undefined
}
