import { type SearchQuery, searchQuery } from './schema'
import { facetAttributes, type Narrowing } from './rules'

const names = ['q', ...Object.keys(facetAttributes), 'cursor']

type Given = Record<string, string | string[] | undefined>

/**
 * The search in a page's address. Parameters that are none of ours are passed over; a choice that is not understood
 * is left out and named in `dropped`, so that the page can say what it did not do.
 */
export function searchAsked(given: Given): { query: SearchQuery; dropped: string[] } {
  const plain = Object.fromEntries(
    names.flatMap((name) => {
      const value = given[name]
      return typeof value === 'string' ? [[name, name === 'q' ? value.slice(0, 200) : value]] : []
    }),
  )
  const dropped: string[] = []
  // Each round takes out what one refusal names; there are only so many names.
  for (let left = names.length; left > 0; left--) {
    const read = searchQuery.safeParse(plain)
    if (read.success) return { query: read.data, dropped }
    const name = String(read.error.issues[0]?.path[0])
    dropped.push(name)
    delete plain[name]
  }
  return { query: searchQuery.parse({}), dropped }
}

/** Whether anything at all is asked for. */
export const asksSomething = (query: SearchQuery): boolean => query.q !== '' || isNarrowed(query)

const choices = Object.keys(facetAttributes) as (keyof Narrowing)[]

export const isNarrowed = (query: Narrowing): boolean => choices.some((name) => query[name] !== undefined)

/** The address of this search with something changed; `undefined` takes a choice back. A change starts at the top. */
export function searchHref({ q, ...query }: SearchQuery, change: Narrowing & { cursor?: string } = {}): string {
  const { cursor, ...chosen } = change
  const wanted = { ...Object.fromEntries(choices.map((name) => [name, query[name]])), ...chosen }
  const parameters = new URLSearchParams(q === '' ? {} : { q })
  for (const [name, value] of Object.entries(wanted)) if (value !== undefined) parameters.set(name, value)
  if (cursor !== undefined) parameters.set('cursor', cursor)
  const text = parameters.toString()
  return text ? `/search?${text}` : '/search'
}
