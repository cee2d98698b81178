import { Readable } from 'node:stream'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { notFound } from '@/lib/errors'
import { services } from '@/lib/services'
import { Question } from '@/models/question'
import { QuestionPhoto } from '@/models/question-photo'
import { photoPath } from './keep-photos'

const PHOTO = 'This photo'

/** Serves a photo to whoever may see its question. @throws Problem 404 */
export async function servePhoto(request: Request, actor: Actor, name: string): Promise<Response> {
  const photo = await QuestionPhoto.findOne({ where: { name } })
  permit(actor, 'question.see', photo && (await Question.findByPk(photo.questionId)), PHOTO)
  const stored = await services().storage.stat(photoPath(name))
  if (!stored) throw notFound(PHOTO)
  const headers = new Headers({
    // A question can be set aside, and its photos with it; so nobody keeps them for long, and no cache between us.
    'Cache-Control': 'private, max-age=600',
    'Content-Security-Policy': "default-src 'none'; sandbox",
    'Content-Type': 'image/webp',
    'Cross-Origin-Resource-Policy': 'same-origin',
    'X-Content-Type-Options': 'nosniff',
    ETag: stored.etag,
  })
  if (request.headers.get('if-none-match') === stored.etag) return new Response(null, { status: 304, headers })
  headers.set('Content-Length', String(stored.bytes))
  if (request.method === 'HEAD') return new Response(null, { headers })
  const bytes = await services().storage.open(photoPath(name))
  return new Response(Readable.toWeb(bytes) as unknown as ReadableStream, { headers })
}
