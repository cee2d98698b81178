import { badRequest } from './errors'

/** A piece of a filter expression. Only a bare word can be an operator: `"OR"` in quotes is always a value. */
export type Piece = { kind: 'word' | 'quoted' | 'sign'; text: string }

export const unreadable = (filter: string, why: string) =>
  badRequest(`The filter \`${filter}\` cannot be read: ${why}.`, 'invalid_search_filter')

function quoted(filter: string, from: number): { text: string; end: number } {
  const quote = filter[from]
  let text = ''
  for (let at = from + 1; at < filter.length; at++) {
    const character = filter[at] ?? ''
    if (character === quote) return { text, end: at + 1 }
    if (character !== '\\') text += character
    // A backslash takes the power from a quote or a backslash, and is itself before anything else.
    else if (filter[at + 1] === quote || filter[at + 1] === '\\') text += filter[++at] ?? ''
    else text += character
  }
  throw unreadable(filter, 'a quote is not closed')
}

/** Cuts a filter expression into words, quoted values and signs. Throws 400 `invalid_search_filter`. */
export function piecesOf(filter: string): Piece[] {
  const pieces: Piece[] = []
  const plain = /\s+|(!=|>=|<=|[=<>()[\],])|([\p{L}\p{N}_./-]+)/uy
  let at = 0
  while (at < filter.length) {
    if (filter[at] === '"' || filter[at] === "'") {
      const { text, end } = quoted(filter, at)
      pieces.push({ kind: 'quoted', text })
      at = end
      continue
    }
    plain.lastIndex = at
    const match = plain.exec(filter)
    if (!match) throw unreadable(filter, `\`${filter[at]}\` is not expected at ${at}`)
    if (match[1]) pieces.push({ kind: 'sign', text: match[1] })
    if (match[2]) pieces.push({ kind: 'word', text: match[2] })
    at = plain.lastIndex
  }
  return pieces
}
