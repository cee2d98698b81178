import { encode } from 'next-auth/jwt'
import { openSession } from '@/lib/auth/sessions'
import { settingsForTests } from './settings'

type Sent = {
  method?: string
  body?: unknown
  raw?: BodyInit
  headers?: Record<string, string>
  as?: string
  params?: object
}
type Route = (request: Request, context: { params: Promise<object> }) => Promise<Response>

/** The cookie of a sign-in that is open in the database, as next-auth would set it. */
export async function cookieOf(userId: string): Promise<string> {
  const token = await encode({
    token: { sub: userId, sid: await openSession(userId) },
    secret: settingsForTests.NEXTAUTH_SECRET,
  })
  return `next-auth.session-token=${token}`
}

/** Calls a route handler as a browser would: `as` is the id of the person who is signed in. */
export async function call(route: Route, path: string, sent: Sent = {}): Promise<Response> {
  const headers = new Headers(sent.headers)
  if (sent.as) headers.set('cookie', await cookieOf(sent.as))
  if (sent.body !== undefined) headers.set('content-type', 'application/json')
  const body = sent.raw ?? (sent.body === undefined ? undefined : JSON.stringify(sent.body))
  const request = new Request(new URL(path, settingsForTests.BASE_URL), {
    method: sent.method ?? (body === undefined ? 'GET' : 'POST'),
    headers,
    body,
  })
  return route(request, { params: Promise.resolve(sent.params ?? {}) })
}
