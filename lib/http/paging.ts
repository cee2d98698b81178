import { z } from 'zod'
import { malformed } from '@/lib/errors'

/** Query of every list: `?cursor=&limit=` with a limit of 1 to 100. */
export const pageQuery = z.object({
  cursor: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(25),
})
export type PageQuery = z.infer<typeof pageQuery>

/** What every list answers with. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({ items: z.array(item), nextCursor: z.string().nullable() })
export type Page<T> = { items: T[]; nextCursor: string | null }

/** A cursor holds the sort values of the last row seen; keyset paging never skips or repeats when rows come and go. */
export const encodeCursor = (values: readonly (string | number)[]): string =>
  Buffer.from(JSON.stringify(values)).toString('base64url')

/** @throws Problem 400 when the cursor is not one of ours of this length */
export function decodeCursor(cursor: string, length: number): (string | number)[] {
  try {
    const values: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'))
    const plain = z
      .array(z.union([z.string().max(200), z.number()]))
      .length(length)
      .safeParse(values)
    if (plain.success) return plain.data
  } catch {
    // falls through to the refusal below
  }
  throw malformed('The cursor is not one of ours.', [{ path: 'cursor', message: 'Take it from nextCursor.' }])
}

/** Cuts the one row too many that was asked for, and says where to go on. */
export function cutPage<T, V>(
  rows: T[],
  limit: number,
  view: (row: T) => V,
  keyOf: (row: T) => (string | number)[],
): Page<V> {
  const shown = rows.slice(0, limit)
  const last = shown.at(-1)
  return {
    items: shown.map(view),
    nextCursor: rows.length > limit && last !== undefined ? encodeCursor(keyOf(last)) : null,
  }
}
