import { copyFile, mkdir, readdir, readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { GET as read } from '@/app/api/episodes/[id]/footage/route'
import { POST as retry } from '@/app/api/episodes/[id]/footage/retry/route'
import { GET as media } from '@/app/media/[...path]/route'
import { env } from '@/lib/env'
import { filmBase } from '@/lib/footage/film-address'
import type { FootageStatus } from '@/lib/footage/views'
import type { Channel } from '@/models/channel'
import { Chapter } from '@/models/chapter'
import type { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { Rendition } from '@/models/rendition'
import type { User } from '@/models/user'
import { makeChannel, makeChapter, makeEpisode, makeMember } from '../factories'
import { Clips } from '../media/clips'
import { freshDatabase } from '../support/database'
import { waitingJobs, workOff } from '../support/jobs'
import { call } from '../support/requests'
import { begin, send } from '../support/tus'

freshDatabase()

const clips = new Clips()
afterAll(() => clips.remove())

let channel: Channel
let owner: User
let episode: Episode

beforeAll(async () => {
  channel = await makeChannel()
  owner = await makeMember(channel, 'owner')
  episode = await makeEpisode(channel)
  const sound = clips.speech('s.wav', 'Look at the crown before you judge the stand.')
  clips.film('film.mp4', { size: '320x240', seconds: 3, sound })
})

async function sendFile(path: string, to: Episode = episode): Promise<string> {
  const bytes = new Uint8Array(await readFile(path))
  const upload = await begin(to.id, owner.id, bytes.length)
  expect((await send(upload, owner.id, 0, bytes)).status).toBe(204)
  return upload
}

const status = async (of: Episode = episode): Promise<FootageStatus> =>
  (await call(read, '/', { as: owner.id, params: { id: of.id } })).json() as Promise<FootageStatus>

type Asked = { headers?: Record<string, string>; method?: 'GET' | 'HEAD' }
const get = (address: string, asked: Asked = {}) =>
  call(media, address, { ...asked, params: { path: address.split('/').slice(2) } })

describe('from the last byte to the film', () => {
  let upload: string

  it('looks a film over, encodes it, and switches the episode to it in the end', async () => {
    upload = await sendFile(clips.at('film.mp4'))
    expect(await workOff('footage.inspect')).toBe(1)
    expect(await status()).toMatchObject({ state: 'encoding', notes: [], isShown: false })
    expect(await workOff('footage.encode')).toBe(1)
    const done = await status()
    expect(done).toMatchObject({ state: 'ready', progress: 1, step: null, isShown: true })
    expect(done.duration).toBeCloseTo(3, 1)
    expect(done.renditions.map(({ height, ready }) => [height, ready])).toEqual([
      [144, true],
      [240, true],
    ])
    expect(await waitingJobs('footage.encode')).toEqual([])
    expect((await readdir(join(env().MEDIA_ROOT, 'films'))).sort()).toEqual([upload])
  })

  it('does nothing the second time', async () => {
    const { encodeFootageById } = await import('@/lib/footage/encode-footage')
    const before = await Footage.findByPk(upload)
    await encodeFootageById({ footageId: upload })
    expect((await Footage.findByPk(upload))?.updatedAt).toEqual(before?.updatedAt)
  })

  it('only switches where a killed worker had finished the folder', async () => {
    await Footage.update({ state: 'encoding', folder: null, durationMs: null, attempt: 0 }, { where: { id: upload } })
    await Rendition.destroy({ where: { footageId: upload } })
    await mkdir(join(env().MEDIA_ROOT, 'films', `making-${upload}-0badcafe`))
    const { encodeFootageById } = await import('@/lib/footage/encode-footage')
    await encodeFootageById({ footageId: upload })
    expect(await status()).toMatchObject({ state: 'ready', renditions: [{ height: 144 }, { height: 240 }] })
    expect(await readdir(join(env().MEDIA_ROOT, 'films'))).toEqual([upload])
  })

  it('keeps the film private until it is published, then serves it, and stops when it is withdrawn', async () => {
    const address = `/media/films/${upload}/master.m3u8`
    expect((await get(address)).status).toBe(404)
    await episode.update({ state: 'published', publishedAt: new Date() })
    const answer = await get(address)
    expect(answer.status).toBe(200)
    expect(answer.headers.get('content-type')).toBe('application/vnd.apple.mpegurl')
    expect(answer.headers.get('cache-control')).toBe('public, no-cache')
    expect(await answer.text()).toContain('#EXT-X-STREAM-INF')
    await episode.update({ state: 'withdrawn', withdrawnAt: new Date() })
    expect((await get(address)).status).toBe(404)
    await episode.update({ state: 'draft' })
  })

  it('opens a private film with a token for its folder, and nothing beside it', async () => {
    const base = filmBase(upload, false)
    const list = await get(`${base}/master.m3u8`)
    expect([list.status, (await list.text()).startsWith('#EXTM3U')]).toEqual([200, true])
    const segment = await get(`${base}/144/00000.m4s`)
    await segment.body?.cancel()
    expect(segment.headers.get('cache-control')).toBe('private, max-age=31536000, immutable')
    expect(segment.headers.get('x-content-type-options')).toBe('nosniff')
    const [, , , token = ''] = base.split('/')
    for (const path of [
      `signed/${token}/films/another/master.m3u8`,
      `signed/${token}/uploads/${upload}`,
      `signed/${token}/films/${upload}/film.json`,
      `signed/${token}/films/${upload}/../${upload}/master.m3u8`,
      `signed/${token.slice(0, -1)}x/films/${upload}/master.m3u8`,
      `uploads/${upload}`,
    ]) {
      const answer = await call(media, '/media/x', { params: { path: path.split('/') } })
      expect(answer.status, path).toBe(404)
    }
  })

  it('answers ranges, HEAD and conditions as RFC 9110 has them', async () => {
    const address = `${filmBase(upload, false)}/plain.mp4`
    const whole = Buffer.from(await (await get(address)).arrayBuffer())
    const part = await get(address, { headers: { range: 'bytes=10-19' } })
    expect([part.status, part.headers.get('content-range')]).toEqual([206, `bytes 10-19/${whole.length}`])
    expect(Buffer.from(await part.arrayBuffer())).toEqual(whole.subarray(10, 20))
    const two = await get(address, { headers: { range: 'bytes=0-1,-2' } })
    expect(two.headers.get('content-type')).toMatch(/^multipart\/byteranges; boundary=/)
    expect((await two.text()).match(/Content-Range/g)).toHaveLength(2)
    const outside = await get(address, { headers: { range: `bytes=${whole.length}-` } })
    expect([outside.status, outside.headers.get('content-range')]).toEqual([416, `bytes */${whole.length}`])
    const head = await get(address, { method: 'HEAD' })
    expect([head.status, head.headers.get('content-length'), await head.text()]).toEqual([
      200,
      String(whole.length),
      '',
    ])
    const etag = head.headers.get('etag') ?? ''
    expect((await get(address, { headers: { 'if-none-match': etag } })).status).toBe(304)
    const changed = await get(address, { headers: { range: 'bytes=0-0', 'if-range': '"other"' } })
    expect([changed.status, (await changed.arrayBuffer()).byteLength]).toEqual([200, whole.length])
  })

  it('replaces the film without touching chapters, and shows the old one until the new one is whole', async () => {
    await makeChapter(episode, 0, 'Crown depth', ['wheat-21'])
    const next = await sendFile(clips.film('again.mp4', { size: '160x120', seconds: 1 }))
    await workOff('footage.inspect')
    await episode.reload()
    expect(episode.footageId).toBe(upload)
    await workOff('footage.encode')
    await episode.reload()
    expect(episode.footageId).toBe(next)
    expect(await Chapter.count({ where: { episodeId: episode.id } })).toBe(1)
    expect(await status()).toMatchObject({ id: next, isShown: true, notes: ['There is no sound in this film.'] })
  })
})

describe('what is no film', () => {
  it('fails with a reason, takes another in its place, and can be tried again', async () => {
    const other = await makeEpisode(channel)
    const bad = await sendFile(clips.text('notes.mp4', 'Drill the beans on Friday.\n'.repeat(100)), other)
    await workOff('footage.inspect')
    const failed = await status(other)
    expect(failed).toMatchObject({ state: 'failed', error: { code: 'not-a-film' }, isShown: false })
    expect(failed.error?.detail).toMatch(/Send the file from the camera/)
    const again = () => call(retry, '/', { method: 'POST', as: owner.id, params: { id: other.id } })
    expect((await again()).status).toBe(202)
    expect((await again()).status).toBe(409)
    await copyFile(clips.at('film.mp4'), join(env().MEDIA_ROOT, 'uploads', bad))
    await workOff('footage.inspect')
    expect(await status(other)).toMatchObject({ state: 'encoding' })
  })

  it('lets only a maker of the channel try again', async () => {
    const adviser = await makeMember(channel, 'adviser')
    const stranger = await makeMember(await makeChannel(), 'owner')
    const again = (as?: string) => call(retry, '/', { method: 'POST', as, params: { id: episode.id } })
    expect((await again()).status).toBe(401)
    expect((await again(stranger.id)).status).toBe(404)
    expect((await again(adviser.id)).status).toBe(403)
    expect((await again(owner.id)).status).toBe(409)
  })

  it('gives up on a film that ends its worker every time, and says so', async () => {
    const other = await makeEpisode(channel)
    const upload = await sendFile(clips.at('film.mp4'), other)
    await Footage.update({ attempt: 6 }, { where: { id: upload } })
    await workOff('footage.inspect')
    expect(await status(other)).toMatchObject({ state: 'failed', error: { code: 'interrupted' } })
  })
})
