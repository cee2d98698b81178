import type { ReadableStream } from 'node:stream/web'
import type { Actor } from '@/lib/auth/actor'
import { malformed, notFound, Problem, wrongType } from '@/lib/errors'
import { services } from '@/lib/services'
import { checksumAlgorithms, parseChecksum, withCheckedChunk } from './checked-chunk'
import { readOwnUpload } from './reads'
import { parseUploadMetadata } from './schema'
import { idHeader, offered, tus } from './tus'
import { beginFootage, forgetUpload, noteReceived } from './writes'

const version = '1.0.0'
const chunkType = 'application/offset+octet-stream'

/** Clients behind old proxies send POST and name the verb they mean (tus 1.0.0, X-HTTP-Method-Override). */
function verbOf(request: Request): string {
  const meant = request.headers.get('x-http-method-override')?.toUpperCase()
  return request.method === 'POST' && meant && ['PATCH', 'DELETE', 'HEAD'].includes(meant) ? meant : request.method
}

/** Every answer of tus names its version, refusals too. */
async function named(answer: Promise<Response>): Promise<Response> {
  return answer.catch((failure: unknown) => {
    if (failure instanceof Problem) Object.assign(failure.headers, { 'Tus-Resumable': version })
    throw failure
  })
}

const wrongVersion = () =>
  new Problem(412, 'Version not spoken', 'Send Tus-Resumable: 1.0.0.', { headers: { 'Tus-Version': version } })

/** tus 1.0.0 for footage: core, creation with upload, termination, expiration and checksum, each verb held against the law. */
export function receiveFootage(actor: Actor, request: Request, uploadId: string | undefined): Promise<Response> {
  const verb = verbOf(request)
  if (verb === 'OPTIONS') return options(request)
  if (request.headers.get('tus-resumable') !== version) return named(Promise.reject(wrongVersion()))
  if (verb === 'POST' && uploadId === undefined) return named(create(actor, request))
  if (uploadId === undefined || verb === 'POST') return named(Promise.reject(notFound('This upload')))
  return named(goOn(actor, request, verb, uploadId))
}

async function options(request: Request): Promise<Response> {
  const response = await hand(request, 'OPTIONS', null, '')
  response.headers.set('Tus-Extension', offered)
  response.headers.set('Tus-Checksum-Algorithm', checksumAlgorithms.join(','))
  return response
}

async function create(actor: Actor, request: Request): Promise<Response> {
  const carriesBytes = request.headers.get('content-type') === chunkType
  const metadata = parseUploadMetadata(request.headers.get('upload-metadata'))
  const length = request.headers.get('upload-length') ?? ''
  if (!/^\d{1,15}$/.test(length)) throw malformed('Upload-Length must say how many bytes the film has.')
  const checksum = carriesBytes ? parseChecksum(request.headers.get('upload-checksum')) : null
  const footage = await beginFootage(actor, metadata, Number(length))
  const send = (body: ReadableStream<Uint8Array> | null) => hand(request, 'POST', body, footage.id)
  const answer = carriesBytes ? chunk(request, checksum, Number(length), send) : send(null)
  const response = await answer.catch(async (failure: unknown) => {
    await forgetUpload(footage.id)
    throw failure
  })
  if (response.status !== 201) await forgetUpload(footage.id)
  return response
}

async function goOn(actor: Actor, request: Request, verb: string, uploadId: string): Promise<Response> {
  const footage = await readOwnUpload(actor, uploadId)
  if (verb === 'DELETE' && footage.state !== 'receiving')
    throw new Problem(403, 'Not allowed', 'A film that has arrived is not removed this way.')
  if (verb !== 'PATCH') {
    const response = await hand(request, verb, null, uploadId)
    if (verb === 'DELETE' && response.status === 204) await forgetUpload(uploadId)
    return response
  }
  if (request.headers.get('content-type') !== chunkType) throw wrongType(`Send the bytes as ${chunkType}.`)
  const checksum = parseChecksum(request.headers.get('upload-checksum'))
  const response = await chunk(request, checksum, footage.bytes, (body) => hand(request, 'PATCH', body, uploadId))
  const offset = Number(response.headers.get('upload-offset') ?? 0)
  if (response.status === 204) await noteReceived(footage, offset)
  return response
}

type Body = ReadableStream<Uint8Array> | null

function chunk(
  request: Request,
  checksum: ReturnType<typeof parseChecksum>,
  room: number,
  send: (body: Body) => Promise<Response>,
) {
  if (!checksum) return send(request.body as unknown as Body)
  return withCheckedChunk(request, checksum, services().storage.localPath('incoming'), room, send)
}

/** Gives the request to the tus server under the verb that was meant and the id that is known to be right. */
function hand(request: Request, method: string, body: Body, id: string): Promise<Response> {
  const headers = new Headers(request.headers)
  headers.delete('x-http-method-override')
  headers.set(idHeader, id)
  const asked = { method, headers, body: body as unknown as BodyInit | null, duplex: 'half', signal: request.signal }
  return tus().handleWeb(new Request(request.url, asked as RequestInit))
}
