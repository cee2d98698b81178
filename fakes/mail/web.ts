import { readFile } from 'node:fs/promises'
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http'
import { join } from 'node:path'
import { letterPage, listPage, missingPage } from './pages'
import type { LetterStore } from './store'
import { style } from './style'

const pagePolicy =
  "default-src 'none'; style-src 'self'; font-src 'self'; frame-src 'self'; form-action 'self'; base-uri 'none'; frame-ancestors 'none'"
/** A letter's own HTML: no script, no form, no fetch; its links open beside it. */
const letterPolicy =
  "default-src 'none'; style-src 'unsafe-inline'; img-src data:; base-uri 'none'; frame-ancestors 'self'; sandbox allow-popups allow-popups-to-escape-sandbox"
const fonts = new Set(['besley-latin-600-normal.woff2', 'atkinson-hyperlegible-next-latin-wght-normal.woff2'])

type Answer = { status?: number; type: string; body: string | Buffer; policy?: string }

const html = (body: string, more: Partial<Answer> = {}): Answer => ({ type: 'text/html; charset=utf-8', body, ...more })
const json = (value: unknown, status = 200): Answer => ({
  status,
  type: status < 400 ? 'application/json' : 'application/problem+json',
  body: JSON.stringify(value),
})
const problem = (status: number, title: string) => json({ type: 'about:blank', title, status }, status)

async function font(name: string): Promise<Answer> {
  const body = fonts.has(name) ? await readFile(join(process.cwd(), 'fonts', name)).catch(() => null) : null
  return body ? { type: 'font/woff2', body } : problem(404, 'Not found')
}

function onMessages(store: LetterStore, id: string | undefined, to: string | undefined): Answer {
  if (id === undefined) return json(store.letters(to))
  const letter = store.letter(id)
  return letter ? json(letter) : problem(404, 'No such letter')
}

function onLetter(store: LetterStore, id: string, formatted: boolean): Answer {
  const letter = store.letter(id)
  if (!letter || (formatted && !letter.html)) return html(missingPage(), { status: 404 })
  if (!formatted) return html(letterPage(letter))
  return html(`<!doctype html><meta charset="utf-8"><base target="_blank">${letter.html}`, { policy: letterPolicy })
}

async function answerTo(store: LetterStore, request: IncomingMessage): Promise<Answer | null> {
  const address = new URL(request.url ?? '/', 'http://mailbox')
  const [folder = '', id, part] = address.pathname.split('/').slice(1).map(decodeURIComponent)
  const to = address.searchParams.get('to') ?? undefined
  if (request.method === 'DELETE' && folder === 'messages' && id === undefined) {
    await store.empty()
    return null
  }
  if (request.method !== 'GET' && request.method !== 'HEAD') return problem(405, 'Only GET, and DELETE of /messages')
  if (folder === 'messages' && part === undefined) return onMessages(store, id, to)
  if (folder === 'letters' && id && (part === undefined || part === 'formatted')) return onLetter(store, id, !!part)
  if (folder === 'style.css') return { type: 'text/css; charset=utf-8', body: style }
  if (folder === 'fonts' && id) return font(id)
  if (address.pathname === '/') return html(listPage(store.letters(to), to ?? ''))
  return html(missingPage(), { status: 404 })
}

function send(response: ServerResponse, answer: Answer | null) {
  response.setHeader('X-Content-Type-Options', 'nosniff')
  response.setHeader('Referrer-Policy', 'no-referrer')
  response.setHeader('Cache-Control', 'no-store')
  if (!answer) return response.writeHead(204).end()
  response.setHeader('Content-Security-Policy', answer.policy ?? pagePolicy)
  return response.writeHead(answer.status ?? 200, { 'Content-Type': answer.type }).end(answer.body)
}

/** The mailbox as pages for people and as JSON at `/messages` for programs. */
export function mailboxServer(store: LetterStore): Server {
  return createServer((request, response) => {
    answerTo(store, request).then(
      (answer) => send(response, answer),
      () => send(response, problem(400, 'The request cannot be read')),
    )
  })
}
