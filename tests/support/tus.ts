import { createHash } from 'node:crypto'
import { DELETE, HEAD, OPTIONS, PATCH, POST } from '@/app/api/footage/[[...upload]]/route'
import { call } from './requests'

const verbs = { POST, HEAD, PATCH, DELETE, OPTIONS }

export type TusCall = {
  as?: string
  upload?: string
  headers?: Record<string, string>
  body?: Uint8Array
  /** Leaves `Tus-Resumable` to `headers`. */
  bare?: boolean
}

/** One call of the upload endpoint, straight at its route handler. */
export const tusCall = (verb: keyof typeof verbs, { as, upload, headers = {}, body, bare }: TusCall = {}) =>
  call(verbs[verb], `/api/footage${upload ? `/${upload}` : ''}`, {
    method: verb,
    as,
    raw: body as BodyInit | undefined,
    headers: { ...(bare ? {} : { 'tus-resumable': '1.0.0' }), ...headers },
    params: { upload: upload ? [upload] : undefined },
  })

const encoded = (text: string) => Buffer.from(text).toString('base64')

export const metadataFor = (episodeId: string, filename = 'field.mp4') =>
  `episodeId ${encoded(episodeId)},filename ${encoded(filename)},filetype ${encoded('video/mp4')}`

export const sha1 = (bytes: Uint8Array) => `sha1 ${createHash('sha1').update(bytes).digest('base64')}`

export const uploadIdOf = (response: Response) => (response.headers.get('location') ?? '').split('/').at(-1) ?? ''

/** Begins an upload and returns its id. */
export async function begin(episodeId: string, as: string, length: number): Promise<string> {
  const headers = { 'upload-length': String(length), 'upload-metadata': metadataFor(episodeId) }
  return uploadIdOf(await tusCall('POST', { as, headers }))
}

export const send = (
  upload: string,
  as: string,
  offset: number,
  body: Uint8Array,
  headers: Record<string, string> = {},
) =>
  tusCall('PATCH', {
    as,
    upload,
    body,
    headers: { 'upload-offset': String(offset), 'content-type': 'application/offset+octet-stream', ...headers },
  })

export async function offsetOf(upload: string, as: string): Promise<string | null> {
  return (await tusCall('HEAD', { as, upload })).headers.get('upload-offset')
}
