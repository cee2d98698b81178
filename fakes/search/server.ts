import { createHash, timingSafeEqual } from 'node:crypto'
import { createServer, type IncomingMessage, type Server } from 'node:http'
import { badRequest, errorBody, SearchError } from './errors'
import { routeFor, type Answer } from './route'
import { routes } from './routes'
import type { Store } from './store'
import type { Tasks } from './tasks'

const LARGEST_BODY = 100 * 1024 * 1024

async function bodyOf(request: IncomingMessage): Promise<unknown> {
  const parts: Buffer[] = []
  let bytes = 0
  for await (const part of request as AsyncIterable<Buffer>) {
    bytes += part.length
    if (bytes > LARGEST_BODY) throw new SearchError(413, 'payload_too_large', 'The body is larger than 100 MB.')
    parts.push(part)
  }
  if (bytes === 0) return undefined
  try {
    return JSON.parse(Buffer.concat(parts).toString('utf8')) as unknown
  } catch {
    throw badRequest('The body is not JSON.', 'malformed_payload')
  }
}

const digest = (text: string) => createHash('sha256').update(text).digest()

function checkKey(request: IncomingMessage, key: string | undefined) {
  if (!key) return
  const given = request.headers.authorization
  if (!given) {
    throw new SearchError(401, 'missing_authorization_header', 'The Authorization header is missing.', 'auth')
  }
  if (!timingSafeEqual(digest(given), digest(`Bearer ${key}`))) {
    throw new SearchError(403, 'invalid_api_key', 'The provided API key is invalid.', 'auth')
  }
}

type House = { store: Store; tasks: Tasks; key: string | undefined }

async function answerTo(request: IncomingMessage, { store, tasks, key }: House): Promise<Answer> {
  const address = new URL(request.url ?? '/', 'http://search')
  const found = routeFor(routes, request.method ?? 'GET', address.pathname)
  if (!found?.route.open) checkKey(request, key)
  if (!found) throw new SearchError(404, 'not_found', `${request.method} ${address.pathname} is not spoken here.`)
  const body = await bodyOf(request)
  return found.route.answer({ store, tasks, params: found.params, query: address.searchParams, body })
}

/** Speaks the API over HTTP with JSON bodies; errors have its documented shape. */
export function searchServer(house: House): Server {
  return createServer((request, response) => {
    answerTo(request, house)
      .catch((error: unknown): Answer => {
        const status = error instanceof SearchError ? error.status : error instanceof URIError ? 400 : 500
        return { status, body: errorBody(error) }
      })
      .then(({ status = 200, body }) => {
        response.writeHead(status, { 'Content-Type': 'application/json' }).end(JSON.stringify(body))
      })
  })
}
