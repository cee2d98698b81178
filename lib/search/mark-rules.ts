import { foldedWords, MARK_CLOSE, MARK_OPEN } from './rules'

/** A text and where its found words are, as character offsets [from, to). */
export type MarkedText = { text: string; marks: [number, number][] }

/** About what is read at a glance beside a title. Common practice, no source. */
const SNIPPET_WORDS = 36

/** Takes our own marks out of a text. A mark without its partner is dropped. */
export function withoutMarks(marked: string): MarkedText {
  const marks: [number, number][] = []
  let text = ''
  let from: number | null = null
  for (const piece of marked.split(new RegExp(`([${MARK_OPEN}${MARK_CLOSE}])`, 'u'))) {
    if (piece === MARK_OPEN) from = text.length
    else if (piece === MARK_CLOSE) {
      if (from !== null && from < text.length) marks.push([from, text.length])
      from = null
    } else text += piece
  }
  return { text, marks }
}

/** The pieces of a marked text in order, for setting it as text with the found words marked. */
export function piecesOf({ text, marks }: MarkedText): { text: string; found: boolean }[] {
  const pieces: { text: string; found: boolean }[] = []
  let at = 0
  for (const [from, to] of marks) {
    if (from > at) pieces.push({ text: text.slice(at, from), found: false })
    pieces.push({ text: text.slice(from, to), found: true })
    at = to
  }
  if (at < text.length) pieces.push({ text: text.slice(at), found: false })
  return pieces
}

/** Marks every word that begins with a sought word; what the search does itself, for when it is not there to do it. */
export function markWords(text: string, sought: readonly string[]): string {
  return text.replace(/[\p{L}\p{N}\p{M}]+/gu, (word) => {
    const folded = foldedWords(word)[0] ?? ''
    return sought.some((each) => folded.startsWith(each)) ? `${MARK_OPEN}${word}${MARK_CLOSE}` : word
  })
}

const wordCount = (text: string) => text.split(/\s+/).length

function joined(parts: readonly MarkedText[]): MarkedText {
  return parts.reduce<MarkedText>(
    (whole, { text, marks }) => {
      const shift = whole.text === '' ? 0 : whole.text.length + 1
      const moved = marks.map(([from, to]): [number, number] => [from + shift, to + shift])
      return { text: whole.text === '' ? text : `${whole.text} ${text}`, marks: [...whole.marks, ...moved] }
    },
    { text: '', marks: [] },
  )
}

function differentMarks({ text, marks }: MarkedText): number {
  return new Set(marks.map(([from, to]) => text.slice(from, to).toLowerCase())).size
}

/**
 * Where a passage is to be opened: at the sentence that holds most of the found words, the first of several.
 * `sentence` is its place; the snippet runs on from there until it is long enough.
 */
export function spokenSnippet(spoken: readonly string[]): MarkedText & { sentence: number } {
  const sentences = spoken.map(withoutMarks)
  const scores = sentences.map(differentMarks)
  const sentence = Math.max(0, scores.indexOf(Math.max(0, ...scores)))
  const parts: MarkedText[] = []
  let words = 0
  for (const part of sentences.slice(sentence)) {
    if (parts.length > 0 && words + wordCount(part.text) > SNIPPET_WORDS) break
    parts.push(part)
    words += wordCount(part.text)
  }
  return { ...joined(parts), sentence }
}

/** A stretch of a longer marked text around its first found word, with an ellipsis where something is left out. */
export function cutAround(marked: string): string {
  const words = marked.split(' ')
  if (words.length <= SNIPPET_WORDS) return marked
  const first = words.findIndex((word) => word.includes(MARK_OPEN))
  const from = Math.max(0, Math.min(first - 6, words.length - SNIPPET_WORDS))
  const to = from + SNIPPET_WORDS
  return `${from > 0 ? '… ' : ''}${words.slice(from, to).join(' ')}${to < words.length ? ' …' : ''}`
}
