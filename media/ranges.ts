/** Byte ranges of HTTP (RFC 9110 section 14). Both ends are inclusive, as on the wire. */
export type ByteRange = { first: number; last: number }

export type RangeAnswer = { status: 200 } | { status: 206; ranges: ByteRange[] } | { status: 416 }

/** More parts than this in one request are nobody's player; the whole is sent instead (RFC 9110 14.2 allows that). */
const mostRanges = 8

/** Reads one range-spec for a thing of `size` bytes. Null where it is malformed, 'outside' where nothing of it exists. */
function readSpec(spec: string, size: number): ByteRange | 'outside' | null {
  const match = /^\s*(\d*)\s*-\s*(\d*)\s*$/.exec(spec)
  const [from = '', to = ''] = match?.slice(1) ?? []
  if (!match || (from === '' && to === '')) return null
  if (from === '') {
    const wanted = Number(to)
    return wanted === 0 || size === 0 ? 'outside' : { first: Math.max(0, size - wanted), last: size - 1 }
  }
  const first = Number(from)
  const last = to === '' ? size - 1 : Number(to)
  if (last < first && to !== '') return null
  return first >= size ? 'outside' : { first, last: Math.min(last, size - 1) }
}

/**
 * What to send for a `Range` header. A header that cannot be read, or names another unit, counts as absent (14.2). `If-Range`
 * must match strongly, else the whole is sent (13.1.5).
 */
export function answerRange(
  header: string | null,
  thing: { size: number; etag: string; modifiedAt: Date },
  ifRange: string | null = null,
): RangeAnswer {
  if (header === null || !isCurrent(ifRange, thing)) return { status: 200 }
  const set = /^bytes\s*=(.+)$/i.exec(header.trim())?.[1]
  if (!set) return { status: 200 }
  const specs = set
    .split(',')
    .filter((spec) => spec.trim() !== '')
    .map((spec) => readSpec(spec, thing.size))
  if (specs.length === 0 || specs.includes(null) || specs.length > mostRanges) return { status: 200 }
  const ranges = specs.filter((spec): spec is ByteRange => spec !== null && spec !== 'outside')
  if (ranges.length === 0) return { status: 416 }
  return overlaps(ranges) ? { status: 200 } : { status: 206, ranges }
}

/** Overlapping parts are a way to make a server send much for little; a player never asks for them. */
function overlaps(ranges: ByteRange[]): boolean {
  const ordered = [...ranges].sort((a, b) => a.first - b.first)
  return ordered.some((range, index) => index > 0 && range.first <= (ordered[index - 1]?.last ?? -1))
}

function isCurrent(ifRange: string | null, thing: { etag: string; modifiedAt: Date }): boolean {
  if (ifRange === null) return true
  if (ifRange.startsWith('"')) return ifRange === thing.etag
  if (ifRange.startsWith('W/')) return false
  return Date.parse(ifRange) === Math.floor(thing.modifiedAt.getTime() / 1000) * 1000
}

/** Whether what the client holds is what there is: `If-None-Match` compared weakly, before `If-Modified-Since` (13.2.2). */
export function isUnchanged(
  headers: { ifNoneMatch: string | null; ifModifiedSince: string | null },
  thing: { etag: string; modifiedAt: Date },
): boolean {
  if (headers.ifNoneMatch !== null) {
    const held = headers.ifNoneMatch.split(',').map((tag) => tag.trim().replace(/^W\//, ''))
    return held.includes('*') || held.includes(thing.etag)
  }
  if (headers.ifModifiedSince === null) return false
  return Math.floor(thing.modifiedAt.getTime() / 1000) * 1000 <= Date.parse(headers.ifModifiedSince)
}

export const contentRange = (range: ByteRange, size: number): string => `bytes ${range.first}-${range.last}/${size}`
