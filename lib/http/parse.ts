import type { z } from 'zod'
import { type FieldError, editionNeeded, malformed, tooLarge, unprocessable, wrongType } from '@/lib/errors'

const JSON_LIMIT = 1024 * 1024

const fieldErrors = (error: z.ZodError): FieldError[] =>
  error.issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message }))

/** PostgreSQL text cannot hold U+0000; said here, it is a 400 and not a 500. */
const refuseNul = (raw: string) => {
  if (raw.includes('\u0000') || raw.includes('\\u0000')) throw malformed('The text holds a NUL character.')
}

export function parseQuery<T>(schema: z.ZodType<T>, url: URL): T {
  const plain: Record<string, string> = {}
  for (const [name, value] of url.searchParams) {
    if (name in plain) throw malformed(`“${name}” is given twice.`)
    refuseNul(value)
    plain[name] = value
  }
  const read = schema.safeParse(plain)
  if (!read.success) throw malformed('The query is not understood.', fieldErrors(read.error))
  return read.data
}

export function parseParams<T>(schema: z.ZodType<T>, params: unknown): T {
  const read = schema.safeParse(params)
  if (!read.success) throw malformed('The address is not understood.', fieldErrors(read.error))
  return read.data
}

/**
 * Reads JSON and holds it against the schema.
 * Broken JSON or a wrong shape is 400; a rule of the domain marked `params: { rule: true }` is 422.
 */
export async function parseJson<T>(schema: z.ZodType<T>, request: Request): Promise<T> {
  const raw = await request.text()
  if (raw.length > JSON_LIMIT) throw tooLarge('At most 1 MB of JSON.')
  const type = request.headers.get('content-type') ?? ''
  if (raw !== '' && !/^application\/(json|[\w.+-]+\+json)\b/i.test(type)) throw wrongType('Send application/json.')
  return checkJson(schema, raw)
}

/** The same for JSON text that did not come as the body, such as the fields of a form. */
export function checkJson<T>(schema: z.ZodType<T>, raw: string): T {
  refuseNul(raw)
  const read = schema.safeParse(jsonOf(raw))
  if (read.success) return read.data
  const errors = fieldErrors(read.error)
  const onlyRules = read.error.issues.every((issue) => issue.code === 'custom' && issue.params?.rule === true)
  throw onlyRules
    ? unprocessable(errors[0]?.message ?? 'A rule is broken.', errors)
    : malformed(summary(errors), errors)
}

const summary = (errors: FieldError[]) => {
  const first = errors[0]
  return first ? `${first.path || 'body'}: ${first.message}` : 'The body is not understood.'
}

function jsonOf(raw: string): unknown {
  if (raw === '') return {}
  try {
    return JSON.parse(raw, (key, value: unknown) => (key === '__proto__' ? undefined : value))
  } catch {
    throw malformed('The body is not JSON.')
  }
}

/** Matches whatever stands: `If-Match: *`, and a missing one where it is optional. */
export const ANY_EDITION = -1
/** Not one of our ETags; editions start at 1, so it never matches. */
const NO_EDITION = 0

/** The edition the caller read. @throws Problem 428 without If-Match, unless it is optional */
export function parseEdition(request: Request, need: true | 'optional'): number {
  const given = request.headers.get('if-match')?.trim()
  if (given === undefined) {
    if (need === 'optional') return ANY_EDITION
    throw editionNeeded()
  }
  if (given === '*') return ANY_EDITION
  return Number(/^"(\d+)"$/.exec(given)?.[1] ?? NO_EDITION)
}
