import type { SearchInput } from './search-input'
import type { Doc, Json } from './shapes'
import { tokens, type Token } from './words'

type Marked = Map<string, number>
type Span = { start: number; end: number }

/** The stretch of `text` that a found word marks: all of it, or the beginning that was typed. */
function spansIn(found: Token[], marked: Marked): Span[] {
  return found.flatMap(({ word, start, end }) => {
    const letters = marked.get(word)
    if (letters === undefined) return []
    return [{ start, end: letters === word.length ? end : Math.min(end, start + letters) }]
  })
}

/** The run of `length` words with the most different marked ones in it; the first such run. */
function window(found: Token[], marked: Marked, length: number): { from: number; to: number } {
  let best = { from: 0, different: 0 }
  for (let from = 0; from < found.length; from++) {
    const run = found.slice(from, from + length)
    const different = new Set(run.map(({ word }) => word).filter((word) => marked.has(word))).size
    if (different > best.different) best = { from, different }
    if (from + length >= found.length) break
  }
  // The first run that holds them all ends on the last of them; half the room left over goes behind it.
  const first = found.slice(best.from).findIndex(({ word }) => marked.has(word))
  const spare = first > 0 ? Math.floor(first / 2) : 0
  const from = Math.max(0, Math.min(best.from + spare, found.length - length))
  return { from, to: Math.min(found.length, from + length) }
}

function cropped(text: string, marked: Marked, length: number, marker: string): string {
  const found = tokens(text)
  if (length === 0 || found.length <= length) return text
  const { from, to } = window(found, marked, length)
  const start = from === 0 ? 0 : (found[from]?.start ?? 0)
  const end = to === found.length ? text.length : (found[to - 1]?.end ?? text.length)
  return `${start > 0 ? marker : ''}${text.slice(start, end)}${end < text.length ? marker : ''}`
}

function highlighted(text: string, marked: Marked, pre: string, post: string): string {
  let out = ''
  let at = 0
  for (const { start, end } of spansIn(tokens(text), marked)) {
    out += `${text.slice(at, start)}${pre}${text.slice(start, end)}${post}`
    at = end
  }
  return out + text.slice(at)
}

function deep(value: Json, change: (text: string) => string): Json {
  if (typeof value === 'string' || typeof value === 'number') return change(String(value))
  if (Array.isArray(value)) return value.map((item) => deep(item, change))
  if (value === null || typeof value !== 'object') return value
  return Object.fromEntries(Object.entries(value).map(([name, item]) => [name, deep(item, change)]))
}

/** `["text:20", "*"]` → how many words of an attribute are kept; undefined when it is not cropped. */
function cropLengthOf(name: string, input: SearchInput): number | undefined {
  for (const wish of input.attributesToCrop ?? []) {
    const [attribute, length] = wish.split(':')
    if (attribute === name || attribute === '*') return length === undefined ? input.cropLength : Number(length)
  }
  return undefined
}

const wants = (names: string[] | null | undefined, name: string) =>
  !!names && (names.includes(name) || names.includes('*'))

/** `_formatted`: numbers as texts, attributes cropped and marked as asked. */
export function formatted(document: Doc, marked: Marked, input: SearchInput): Doc {
  const entries = Object.entries(document).map(([name, value]): [string, Json] => {
    const length = cropLengthOf(name, input)
    const mark = wants(input.attributesToHighlight, name)
    const change = (text: string) => {
      const short = length === undefined ? text : cropped(text, marked, length, input.cropMarker)
      return mark ? highlighted(short, marked, input.highlightPreTag, input.highlightPostTag) : short
    }
    return [name, deep(value, change)]
  })
  return Object.fromEntries(entries)
}

/** `_matchesPosition`: documented as offsets and lengths in bytes. */
export function matchesPosition(document: Doc, marked: Marked): Record<string, { start: number; length: number }[]> {
  const found: Record<string, { start: number; length: number }[]> = {}
  for (const [name, value] of Object.entries(document)) {
    if (typeof value !== 'string') continue
    const spans = spansIn(tokens(value), marked).map(({ start, end }) => ({
      start: Buffer.byteLength(value.slice(0, start)),
      length: Buffer.byteLength(value.slice(start, end)),
    }))
    if (spans.length > 0) found[name] = spans
  }
  return found
}
