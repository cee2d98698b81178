import { Problem, unavailable } from '@/lib/errors'
import { log } from '@/lib/log'

type Failure = { name?: string; original?: { code?: string } }

/** Names Sequelize gives to a database that is away; the caller should come back, not give up. */
const AWAY = /^SequelizeConnection|ConnectionAcquireTimeout/
const AWAY_CODES = new Set(['57P01', '57P02', '57P03', '53300', '08006', '08001', 'ECONNREFUSED', 'ECONNRESET'])

function asProblem(failure: unknown, requestId: string): Problem {
  if (failure instanceof Problem) return failure
  const { name = '', original } = (failure ?? {}) as Failure
  if (AWAY.test(name) || AWAY_CODES.has(original?.code ?? '')) return unavailable('The database')
  if (name === 'SequelizeUniqueConstraintError')
    return new Problem(409, 'Not possible now', 'Something with the same name or number is already there.')
  log.error({ err: failure, requestId }, 'request failed')
  return new Problem(500, 'Our fault', 'Something failed on our side. What you sent was not saved; please try again.')
}

/** RFC 9457 answer for whatever was thrown. Surprises are logged with the request id and told without detail. */
export function problemResponse(failure: unknown, requestId: string): Response {
  const problem = asProblem(failure, requestId)
  const body = {
    type: 'about:blank',
    title: problem.title,
    status: problem.status,
    detail: problem.detail,
    ...(problem.errors ? { errors: problem.errors } : {}),
    ...problem.also,
    requestId,
  }
  return new Response(JSON.stringify(body), {
    status: problem.status,
    headers: {
      'Content-Type': 'application/problem+json; charset=utf-8',
      'Cache-Control': 'no-store',
      ...problem.headers,
    },
  })
}
