import { z } from 'zod'
import { badRequest } from './errors'
import type { Doc } from './shapes'

/** What the bodies and queries of requests must look like. */
const uid = z.string().regex(/^[\w-]{1,512}$/)
export const indexBody = z.object({ uid, primaryKey: z.string().nullish() })
export const indexChange = z.object({ primaryKey: z.string().nullish() })
export const documentsBody = z
  .union([z.array(z.record(z.string(), z.json())), z.record(z.string(), z.json())])
  .transform((read): Doc[] => (Array.isArray(read) ? (read as Doc[]) : [read as Doc]))
export const idsBody = z.array(z.union([z.string(), z.number()])).transform((ids) => ids.map(String))
export const filterBody = z.object({ filter: z.json() })
export const swapsBody = z.array(z.object({ indexes: z.tuple([uid, uid]), rename: z.literal(false).optional() }))
export const multiBody = z.strictObject({ queries: z.array(z.looseObject({ indexUid: uid })) })
const listShape = z.object({
  offset: z.coerce.number().int().min(0).default(0),
  limit: z.coerce.number().int().min(0).default(20),
})
export const fetchBody = listShape.extend({
  filter: z.unknown().optional(),
  fields: z.array(z.string()).nullish(),
  ids: z.array(z.union([z.string(), z.number()])).nullish(),
})

/** Reads by a shape, or throws 400 with the path of the first thing that does not fit. */
export function readAs<T>(shape: z.ZodType<T>, value: unknown, code = 'bad_request'): T {
  const read = shape.safeParse(value)
  if (read.success) return read.data
  const issue = read.error.issues[0]
  throw badRequest(`Invalid value at \`.${issue?.path.join('.') ?? ''}\`: ${issue?.message}`, code)
}

export const listQuery = (query: URLSearchParams) => readAs(listShape, Object.fromEntries(query))
