import { WebVTTParser } from 'webvtt-parser'
import { beforeAll, describe, expect, it } from 'vitest'
import { GET as readTrack, PUT as saveTrack } from '@/app/api/episodes/[id]/captions/[language]/route'
import { POST as bring } from '@/app/api/episodes/[id]/captions/route'
import type { TrackView } from '@/lib/captions/views'
import type { Channel } from '@/models/channel'
import { CaptionTrack } from '@/models/caption-track'
import type { Episode } from '@/models/episode'
import type { User } from '@/models/user'
import { makeChannel, makeEpisode, makeMember } from '../factories'
import { freshDatabase } from '../support/database'
import { call } from '../support/requests'

freshDatabase()

let channel: Channel
let owner: User
let stranger: User
let episode: Episode

beforeAll(async () => {
  channel = await makeChannel()
  owner = await makeMember(channel, 'owner')
  stranger = await makeMember(await makeChannel(), 'owner')
  episode = await makeEpisode(channel)
})

const good = 'WEBVTT\n\n00:00.000 --> 00:02.000\nCount <b>what</b> lives.\n\n00:02.500 --> 00:04.000\nÆhren & Körner\n'

function send(text: string, as: string | undefined, filename = 'words.vtt', fields: Record<string, string> = {}) {
  const form = new FormData()
  for (const [name, value] of Object.entries({ language: 'en', kind: 'captions', ...fields })) form.set(name, value)
  form.set('file', new File([text], filename))
  return call(bring, '/x', { method: 'POST', raw: form, as, params: { id: episode.id } })
}

const track = (language: string, as = owner.id) => call(readTrack, '/x', { as, params: { id: episode.id, language } })

describe('a caption file', () => {
  it('is taken from the desk alone', async () => {
    expect((await send(good, undefined)).status).toBe(401)
    expect((await send(good, stranger.id)).status).toBe(404)
    expect((await send(good, owner.id)).status).toBe(201)
  })

  it('comes back as a file that the W3C parser reads without a fault, with the same words and times', async () => {
    await send(good, owner.id)
    const file = await track('en.vtt')
    expect(file.headers.get('content-type')).toBe('text/vtt; charset=utf-8')
    const parsed = new WebVTTParser().parse(await file.text(), 'subtitles')
    expect(parsed.errors).toEqual([])
    expect(parsed.cues.map(({ startTime, endTime }) => [startTime, endTime])).toEqual([
      [0, 2],
      [2.5, 4],
    ])
    const { cues } = (await (await track('en')).json()) as TrackView
    expect(cues.map(({ text }) => text)).toEqual(['Count what lives.', 'Æhren & Körner'])
  })

  it('is refused by line when it cannot be read, and what stood before stays', async () => {
    await send(good, owner.id)
    const refused = await send('WEBVTT\n\n00:05.000 --> 00:02.000\nBackwards\n', owner.id)
    expect(refused.status).toBe(422)
    expect(await refused.json()).toMatchObject({ errors: [{ path: 'line 3', message: expect.any(String) }] })
    expect(((await (await track('en')).json()) as TrackView).cues).toHaveLength(2)
  })

  it('may be SRT, and another language stands beside the first', async () => {
    const srt = '1\n00:00:00,000 --> 00:00:02,000\nCuente lo que vive.\n'
    expect((await send(srt, owner.id, 'palabras.srt', { language: 'es' })).status).toBe(201)
    expect(await CaptionTrack.count({ where: { episodeId: episode.id } })).toBe(2)
    expect((await (await track('es')).json()) as TrackView).toMatchObject({ label: 'Español' })
  })

  it('must come as a form, with a file, in a language that has a tag', async () => {
    const form = new FormData()
    form.set('language', 'en')
    const without = await call(bring, '/x', { method: 'POST', raw: form, as: owner.id, params: { id: episode.id } })
    expect(without.status).toBe(400)
    const json = await call(bring, '/x', { body: {}, as: owner.id, params: { id: episode.id } })
    expect(json.status).toBe(415)
    expect((await send(good, owner.id, 'words.vtt', { language: 'not a tag!' })).status).toBe(400)
  })
})

describe('edited cues', () => {
  const save = (cues: object[], etag?: string) =>
    call(saveTrack, '/x', {
      method: 'PUT',
      body: { cues },
      as: owner.id,
      params: { id: episode.id, language: 'en' },
      headers: etag ? { 'if-match': etag } : {},
    })

  it('are saved against the edition that was read, and by one of two', async () => {
    const etag = (await send(good, owner.id)).headers.get('etag') ?? ''
    expect((await save([])).status).toBe(428)
    const cue = (text: string) => [{ start: 0, end: 1.5, text }]
    const both = await Promise.all([save(cue('One'), etag), save(cue('Two'), etag)])
    expect(both.map(({ status }) => status).sort()).toEqual([200, 412])
    expect((await save([{ start: 3, end: 2, text: 'Back' }], '*')).status).toBe(422)
  })

  it('keep what looks like markup as words', async () => {
    await send(good, owner.id)
    await save([{ start: 0, end: 2, text: '<script>alert(1)</script> --> & so on' }], '*')
    const file = await (await track('en.vtt')).text()
    expect(file).not.toContain('<script>')
    expect(((await (await track('en')).json()) as TrackView).cues[0]?.text).toBe(
      '<script>alert(1)</script> --> & so on',
    )
  })
})
