import { Readable } from 'node:stream'
import '@/models/associations'
import { now } from '@/lib/clock'
import { env } from '@/lib/env'
import { notFound, Problem } from '@/lib/errors'
import { services } from '@/lib/services'
import { answerRange, contentRange, isUnchanged, type ByteRange } from '@/media/ranges'
import { opensFolder } from '@/media/sign'
import { safeName, type Stored } from '@/media/storage'
import { Episode } from '@/models/episode'
import { multipart } from './multipart-body'

/** What may be served, and as what (RFC 8216, Apple's HLS authoring specification 10.4). Nothing else in a folder is. */
const types: Record<string, string> = {
  m3u8: 'application/vnd.apple.mpegurl',
  m4s: 'video/iso.segment',
  mp4: 'video/mp4',
  jpg: 'image/jpeg',
}

const yearImmutable = 'max-age=31536000, immutable'

type Wanted = { name: string; type: string; cache: string }

/** Whether this folder is the film that a published episode shows at this moment. Withdrawn, it is not, at once. */
const isPublic = async (folder: string): Promise<boolean> =>
  (await Episode.count({ where: { state: 'published', '$footage.folder$': folder }, include: ['footage'] })) > 0

/** Finds out what is asked for and whether it may be had. Everything that may not is not there. @throws Problem 404 */
async function allow(path: readonly string[]): Promise<Wanted> {
  const [root, second = '', ...others] = path
  const isSigned = root === 'signed'
  const [top, folder = '', ...rest] = isSigned ? others : path
  const file = rest.at(-1) ?? ''
  const type = types[file.slice(file.lastIndexOf('.') + 1)]
  if (top !== 'films' || folder === '' || !type) throw notFound()
  const may = isSigned ? opensFolder(second, `films/${folder}`, now(), env().MEDIA_SECRET) : await isPublic(folder)
  if (!may) throw notFound()
  // Segments never change. Playlists and stills are asked about each time, so that a withdrawn film stops at its next list.
  const keep = /\.m4s$|^init\.mp4$/.test(file) ? yearImmutable : 'no-cache'
  return { name: ['films', folder, ...rest].join('/'), type, cache: `${isSigned ? 'private' : 'public'}, ${keep}` }
}

/** Serves one file of a film: ranges, HEAD, conditional requests (RFC 9110). @throws Problem 404, 416 */
export async function serveFilm(request: Request, path: readonly string[]): Promise<Response> {
  const wanted = await allow(path)
  const stored = await find(wanted.name)
  const headers = new Headers({
    'Accept-Ranges': 'bytes',
    'Cache-Control': wanted.cache,
    'Content-Type': wanted.type,
    'Cross-Origin-Resource-Policy': 'same-origin',
    ETag: stored.etag,
    'Last-Modified': stored.modifiedAt.toUTCString(),
    'X-Content-Type-Options': 'nosniff',
  })
  const asked = (name: string) => request.headers.get(name)
  const thing = { size: stored.bytes, etag: stored.etag, modifiedAt: stored.modifiedAt }
  if (isUnchanged({ ifNoneMatch: asked('if-none-match'), ifModifiedSince: asked('if-modified-since') }, thing)) {
    return new Response(null, { status: 304, headers })
  }
  // Ranges are defined for GET alone (RFC 9110 14.2).
  const answer =
    request.method === 'GET' ? answerRange(asked('range'), thing, asked('if-range')) : { status: 200 as const }
  if (answer.status === 416) throw unsatisfiable(stored)
  if (answer.status === 206) return parts(request, wanted, stored, answer.ranges, headers)
  headers.set('Content-Length', String(stored.bytes))
  const body = request.method === 'HEAD' ? null : await stream(request, wanted.name)
  return new Response(body, { status: 200, headers })
}

async function find(name: string): Promise<Stored> {
  const isNamed = (() => {
    try {
      return safeName(name) === name
    } catch {
      return false
    }
  })()
  const stored = isNamed ? await services().storage.stat(name) : null
  if (!stored) throw notFound()
  return stored
}

const unsatisfiable = (stored: Stored) =>
  new Problem(416, 'Outside the file', 'None of the bytes asked for are in this file.', {
    headers: { 'Content-Range': `bytes */${stored.bytes}` },
  })

async function parts(request: Request, wanted: Wanted, stored: Stored, ranges: ByteRange[], headers: Headers) {
  const [only, ...more] = ranges
  if (only && more.length === 0) {
    headers.set('Content-Range', contentRange(only, stored.bytes))
    headers.set('Content-Length', String(only.last - only.first + 1))
    return new Response(await stream(request, wanted.name, only), { status: 206, headers })
  }
  const { type, body } = multipart(wanted.type, stored.bytes, ranges, (range) =>
    services().storage.open(wanted.name, range),
  )
  headers.set('Content-Type', type)
  return new Response(toWeb(request, Readable.from(body)), { status: 206, headers })
}

const stream = async (request: Request, name: string, range?: ByteRange) =>
  toWeb(request, await services().storage.open(name, range))

/** A player that jumps lets go of the request; the file is closed with it. */
function toWeb(request: Request, readable: Readable): ReadableStream {
  request.signal.addEventListener('abort', () => readable.destroy(), { once: true })
  return Readable.toWeb(readable) as unknown as ReadableStream
}
