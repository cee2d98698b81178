import sharp from 'sharp'
import { beforeAll, describe, expect, it } from 'vitest'
import { POST as askRoute } from '@/app/api/questions/route'
import { GET as photoRoute } from '@/app/media/photos/[name]/route'
import { questionOutput } from '@/lib/questions/schema'
import { Question } from '@/models/question'
import { QuestionPhoto } from '@/models/question-photo'
import { freshDatabase } from '../support/database'
import { type Farm, makeFarm, move } from '../support/questions'
import { call } from '../support/requests'

freshDatabase()

let farm: Farm
let jpeg: Buffer
beforeAll(async () => {
  farm = await makeFarm()
  const create = { width: 64, height: 48, channels: 3, background: '#5f9a4f' } as const
  jpeg = await sharp({ create }).jpeg().toBuffer()
})

function form(photos: Buffer[], fields: Record<string, string> = {}): FormData {
  const made = new FormData()
  const all = { channel: farm.channel.slug, title: 'What is on this leaf?', body: '', crop: 'wheat', at: '', ...fields }
  for (const [name, value] of Object.entries(all)) made.append(name, value)
  for (const photo of photos)
    made.append('photos', new Blob([new Uint8Array(photo)], { type: 'image/jpeg' }), 'Blatt ä.jpg')
  return made
}
const send = (raw: FormData, headers: Record<string, string> = {}) =>
  call(askRoute, '/api/questions', { raw, as: farm.asker.id, headers })
const fetchPhoto = (url: string, as?: string) => call(photoRoute, url, { as, params: { name: url.split('/').at(-1) } })

describe('a question with photos', () => {
  it('keeps them drawn anew, and shows them to whoever may see the question', async () => {
    const response = await send(form([jpeg, jpeg]))
    expect(response.status).toBe(201)
    const question = questionOutput.parse(await response.json())
    expect(question).toMatchObject({
      crop: 'wheat',
      photos: [
        { width: 64, height: 48 },
        { width: 64, height: 48 },
      ],
    })
    const url = question.photos[0]?.url ?? ''
    const photo = await fetchPhoto(url)
    expect([photo.status, photo.headers.get('content-type')]).toEqual([200, 'image/webp'])
    expect(photo.headers.get('content-security-policy')).toContain('sandbox')
    expect((await sharp(Buffer.from(await photo.arrayBuffer())).metadata()).format).toBe('webp')

    await move('set-aside', question.id, farm.owner.id, { reason: 'Not ours.' })
    expect((await fetchPhoto(url)).status).toBe(404)
    expect((await fetchPhoto(url, farm.stranger.id)).status).toBe(404)
    expect((await fetchPhoto(url, farm.asker.id)).status).toBe(200)
  })

  it('is one question when it is sent again under the same key', async () => {
    const key = { 'idempotency-key': 'photos-1' }
    const ids = await Promise.all(
      [1, 2, 3].map(async () => ((await (await send(form([jpeg]), key)).json()) as { id: string }).id),
    )
    expect(new Set(ids).size).toBe(1)
    expect(await QuestionPhoto.count({ where: { questionId: ids[0] } })).toBe(1)
    expect((await send(form([]), key)).status).toBe(422)
  })

  it('is refused with a sentence when a photo is none, and nothing is kept of it', async () => {
    const before = await Question.count()
    const refused = await send(form([jpeg, Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>')]))
    expect(refused.status).toBe(422)
    expect(await refused.json()).toMatchObject({
      detail: '“Blatt ä.jpg”: A drawing (SVG) is not a photo. Send a JPEG.',
      errors: [{ path: 'photos.1' }],
    })
    expect((await send(form([jpeg, jpeg, jpeg, jpeg, jpeg]))).status).toBe(400)
    expect((await send(form([Buffer.alloc(15 * 1024 * 1024 + 1)]))).status).toBe(413)
    expect((await send(form([jpeg], { title: '' }))).status).toBe(400)
    expect((await send(form([jpeg], { at: '3' }))).status).toBe(422)
    expect(await Question.count()).toBe(before)
  })

  it('needs somebody who is signed in', async () => {
    expect((await call(askRoute, '/api/questions', { raw: form([jpeg]) })).status).toBe(401)
  })
})
