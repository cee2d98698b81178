import { type NextRequest, NextResponse } from 'next/server'

/**
 * Writes the content security policy with a nonce of its own for every page. It decides nothing about people: who may
 * see what is the law's alone (lib/auth/policy.ts).
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.randomUUID()).toString('base64')
  const policy = policyWith(nonce)
  const headers = new Headers(request.headers)
  // Next reads the nonce for its own scripts from the request's policy.
  headers.set('content-security-policy', policy)
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('Content-Security-Policy', policy)
  return response
}

// The development server evaluates what it sends.
const evaluating = process.env.NODE_ENV === 'development' ? " 'unsafe-eval'" : ''

const policyWith = (nonce: string): string =>
  [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${evaluating}`,
    // Lanes and blocks are placed by style attributes, and the dialog brings a style element.
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' data: blob:",
    // hls.js feeds the picture through a blob and unpacks in a worker made from one.
    "media-src 'self' blob:",
    "worker-src 'self' blob:",
    "connect-src 'self'",
    "font-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ')

/** Uploads and films stay outside: a request that passes here is cut at 10 MB without a word. */
export const config = { matcher: ['/((?!api/|media/|_next/|favicon|apple-touch|manifest|robots|fonts/).*)'] }
