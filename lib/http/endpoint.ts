import type { z } from 'zod'
import { type Actor, isPerson } from '@/lib/auth/actor'
import { actorOf } from '@/lib/auth/actor-of-request'
import { signInNeeded } from '@/lib/errors'
import { log } from '@/lib/log'
import { Answer } from './answers'
import { answeredOnce } from './idempotency'
import { ANY_EDITION, parseEdition, parseJson, parseParams, parseQuery } from './parse'
import { problemResponse } from './problem-response'
import { requestIdOf } from './request-id'
import { refuseCrossSite } from './same-origin'

/** What an endpoint takes and gives; the same schemas validate and make up /api/openapi.json. */
export type EndpointSpec<P, Q, I> = {
  summary: string
  params?: z.ZodType<P>
  query?: z.ZodType<Q>
  input?: z.ZodType<I>
  output?: z.ZodType
  /** An edit: needs the ETag that was read, as If-Match. */
  edition?: true | 'optional'
  /** A POST that makes something: honours Idempotency-Key and answers 201. */
  creates?: true
  /** Also for people who are not signed in, though it changes something. */
  open?: true
  /** `raw`: the body is the endpoint's own business (uploads, forms). */
  body?: 'json' | 'raw'
  /** Reads the body where it may also be a form; what it gives counts as the input, and so for Idempotency-Key too. */
  read?: (request: Request) => Promise<I>
}

export type Asked<P, Q, I> = {
  request: Request
  actor: Actor
  params: P
  query: Q
  input: I
  edition: number
  requestId: string
}

type Context = { params: Promise<object> }
export type Endpoint = ((request: Request, context: Context) => Promise<Response>) & {
  spec: EndpointSpec<unknown, unknown, unknown>
}

const READS = new Set(['GET', 'HEAD', 'OPTIONS'])

function toResponse(answer: unknown): Response {
  if (answer instanceof Response) return answer
  const { status, body, headers } = answer instanceof Answer ? answer : new Answer(200, answer)
  if (status === 204) return new Response(null, { status, headers })
  return new Response(JSON.stringify(body), {
    status,
    headers: { 'Content-Type': 'application/json; charset=utf-8', 'Cache-Control': 'private, no-store', ...headers },
  })
}

async function inputOf<P, Q, I>({ input, body, read }: EndpointSpec<P, Q, I>, request: Request): Promise<I> {
  if (read) return read(request)
  return input && body !== 'raw' ? parseJson(input, request) : (undefined as I)
}

async function ask<P, Q, I>(spec: EndpointSpec<P, Q, I>, request: Request, context: Context, requestId: string) {
  const actor = await actorOf(request)
  if (!READS.has(request.method)) {
    refuseCrossSite(request)
    if (!spec.open && !isPerson(actor)) throw signInNeeded()
  }
  const params = spec.params ? parseParams(spec.params, await context.params) : (undefined as P)
  const query = spec.query ? parseQuery(spec.query, new URL(request.url)) : (undefined as Q)
  const edition = spec.edition ? parseEdition(request, spec.edition) : ANY_EDITION
  const input = await inputOf(spec, request)
  return { request, actor, params, query, input, edition, requestId } satisfies Asked<P, Q, I>
}

/** The one wrapper: origin, actor, parsing, idempotency, problem+json, request id, log. Nobody writes `try` in a route. */
export function endpoint<P = undefined, Q = undefined, I = undefined>(
  spec: EndpointSpec<P, Q, I>,
  answer: (asked: Asked<P, Q, I>) => unknown,
): Endpoint {
  const serve = async (request: Request, context: Context): Promise<Response> => {
    const requestId = requestIdOf(request)
    const started = performance.now()
    const response = await ask(spec, request, context, requestId)
      .then((asked) => (spec.creates ? answeredOnce(asked, answer) : answer(asked)))
      .then(toResponse)
      .catch((failure: unknown) => problemResponse(failure, requestId))
    response.headers.set('X-Request-Id', requestId)
    const took = Math.round(performance.now() - started)
    log.info({ requestId, method: request.method, path: new URL(request.url).pathname, status: response.status, took })
    return response
  }
  return Object.assign(serve, { spec: spec as EndpointSpec<unknown, unknown, unknown> })
}
