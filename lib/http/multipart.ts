import { Readable } from 'node:stream'
import type { ReadableStream as NodeStream } from 'node:stream/web'
import type { Request as ExpressRequest, RequestHandler, Response as ExpressResponse } from 'express'
import type {} from 'multer'
import { malformed, Problem, tooLarge, wrongType } from '@/lib/errors'

export type Form = { fields: Record<string, string>; files: Express.Multer.File[] }

type MulterFailure = { code?: string; message?: string; field?: string }

function asProblem(failure: unknown): unknown {
  if (failure instanceof Problem) return failure
  const { code = '', message = '', field } = (failure ?? {}) as MulterFailure
  if (code === 'LIMIT_FILE_SIZE') return tooLarge('The file is larger than what is taken here.')
  if (code.startsWith('LIMIT_')) return malformed(`Not as expected: ${message}${field ? ` (${field})` : ''}.`)
  if (/Unexpected end of form|Multipart|Malformed/i.test(message)) return malformed('The form arrived incomplete.')
  return failure
}

/**
 * Runs a multer upload on a web Request, which multer does not know.
 * @param most bytes of the whole form; checked before multer reads it, because multer drains a too large body to its end
 * @throws Problem 400 incomplete or unexpected parts, 413, 415
 */
export async function readForm(upload: RequestHandler, request: Request, most: number): Promise<Form> {
  const type = request.headers.get('content-type') ?? ''
  if (!type.startsWith('multipart/form-data') || !request.body) throw wrongType('Send multipart/form-data.')
  if (Number(request.headers.get('content-length') ?? 0) > most) throw tooLarge(`At most ${Math.round(most / 1e6)} MB.`)
  const stream = Readable.fromWeb(request.body as unknown as NodeStream<Uint8Array>)
  const asked = Object.assign(stream, {
    method: request.method,
    url: request.url,
    // multer takes a form for absent when neither length nor encoding is told, as in a Request made by hand.
    headers: { 'transfer-encoding': 'chunked', ...Object.fromEntries(request.headers) },
  }) as unknown as ExpressRequest
  const abort = () => stream.destroy(new Error('the sender went away'))
  request.signal.addEventListener('abort', abort, { once: true })
  return new Promise<Form>((resolve, reject) => {
    upload(asked, {} as ExpressResponse, (failure?: unknown) => {
      request.signal.removeEventListener('abort', abort)
      if (failure) {
        stream.destroy()
        reject(asProblem(failure))
        return
      }
      const files = (asked.files ?? (asked.file ? [asked.file] : [])) as Express.Multer.File[]
      resolve({ fields: { ...(asked.body as Record<string, string>) }, files })
    })
  })
}
