import { env } from '@/lib/env'
import { forbidden } from '@/lib/errors'

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS'])

/**
 * Refuses a write that a browser sends from another site on the strength of our cookie.
 * A caller with neither Origin nor Sec-Fetch-Site is no browser, and carries no stranger's cookie.
 */
export function refuseCrossSite(request: Request): void {
  if (SAFE.has(request.method)) return
  const origin = request.headers.get('origin')
  if (origin === null) {
    const site = request.headers.get('sec-fetch-site')
    if (site === null || site === 'same-origin' || site === 'none') return
    throw forbidden('This was sent from another site.')
  }
  const host = request.headers.get('host')
  if (origin === new URL(env().BASE_URL).origin) return
  if (URL.canParse(origin) && new URL(origin).host === host) return
  throw forbidden('This was sent from another site.')
}
