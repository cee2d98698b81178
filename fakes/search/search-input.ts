import { z } from 'zod'
import { badRequest } from './errors'

const names = z.array(z.string())

/** The parameters of a search that are understood here. A parameter that is not is refused, never passed over. */
const shape = z.strictObject({
  q: z.string().nullish(),
  offset: z.int().min(0).default(0),
  limit: z.int().min(0).default(20),
  page: z.int().min(0).optional(),
  hitsPerPage: z.int().min(0).optional(),
  filter: z.unknown().optional(),
  facets: names.nullish(),
  sort: names.nullish(),
  distinct: z.string().nullish(),
  matchingStrategy: z.enum(['last', 'all', 'frequency']).default('last'),
  attributesToSearchOn: names.nullish(),
  attributesToRetrieve: names.default(['*']),
  attributesToHighlight: names.nullish(),
  highlightPreTag: z.string().default('<em>'),
  highlightPostTag: z.string().default('</em>'),
  attributesToCrop: names.nullish(),
  cropLength: z.int().min(0).default(10),
  cropMarker: z.string().default('…'),
  showMatchesPosition: z.boolean().default(false),
  showRankingScore: z.boolean().default(false),
  rankingScoreThreshold: z.number().min(0).max(1).nullish(),
})

export type SearchInput = z.infer<typeof shape>

const inCode = (name: string) => name.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`)

/** Reads the body of a search. Throws 400 with `invalid_search_<parameter>`. */
export function searchInput(body: unknown): SearchInput {
  const read = shape.safeParse(body ?? {})
  if (read.success) return read.data
  const issue = read.error.issues[0]
  const name = issue?.path[0]
  if (issue?.code === 'unrecognized_keys') throw badRequest(`Unknown field \`${issue.keys[0]}\`.`)
  if (typeof name !== 'string') throw badRequest('The body of a search is an object.')
  throw badRequest(`Invalid value at \`.${name}\`: ${issue?.message}`, `invalid_search_${inCode(name)}`)
}
