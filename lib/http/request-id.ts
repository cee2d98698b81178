import { randomUUID } from 'node:crypto'

/** The caller's own id where it is harmless to print, else a new one. */
export function requestIdOf(request: Request): string {
  const given = request.headers.get('x-request-id')
  return given && /^[\w-]{8,64}$/.test(given) ? given : randomUUID()
}
