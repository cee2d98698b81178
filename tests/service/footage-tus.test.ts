import { randomBytes } from 'node:crypto'
import { readdir, readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { beforeAll, describe, expect, it } from 'vitest'
import { env } from '@/lib/env'
import { reconcileFootage } from '@/lib/footage/reconcile-uploads'
import type { Channel } from '@/models/channel'
import type { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import type { User } from '@/models/user'
import { makeChannel, makeEpisode, makeMember } from '../factories'
import { freshDatabase } from '../support/database'
import { begin, metadataFor, offsetOf, send, sha1, tusCall, uploadIdOf } from '../support/tus'

freshDatabase()

let channel: Channel
let owner: User
let episode: Episode

beforeAll(async () => {
  channel = await makeChannel()
  owner = await makeMember(channel, 'owner')
  episode = await makeEpisode(channel)
})

const bytes = (length: number) => new Uint8Array(randomBytes(length))
const stored = async (upload: string) => readFile(join(env().MEDIA_ROOT, 'uploads', upload))
const chunkType = { 'content-type': 'application/offset+octet-stream' }

describe('the core of tus 1.0.0', () => {
  it('says in OPTIONS what is spoken, and needs no version for it', async () => {
    const answer = await tusCall('OPTIONS', { bare: true })
    expect(answer.status).toBe(204)
    expect(answer.headers.get('tus-version')).toBe('1.0.0')
    expect(Number(answer.headers.get('tus-max-size'))).toBe(env().FOOTAGE_MAX_BYTES)
    const extensions = answer.headers.get('tus-extension')?.split(',') ?? []
    expect(extensions.sort()).toEqual(['checksum', 'creation', 'creation-with-upload', 'expiration', 'termination'])
    expect(answer.headers.get('tus-checksum-algorithm')?.split(',')).toContain('sha1')
  })

  it('answers another version with 412 and its own, and does nothing', async () => {
    const upload = await begin(episode.id, owner.id, 4)
    for (const headers of [{}, { 'tus-resumable': '0.2.2' }] as Record<string, string>[]) {
      const answer = await tusCall('PATCH', {
        as: owner.id,
        upload,
        bare: true,
        headers: { ...headers, ...chunkType, 'upload-offset': '0' },
        body: bytes(4),
      })
      expect(answer.status).toBe(412)
      expect(answer.headers.get('tus-version')).toBe('1.0.0')
    }
    expect(await offsetOf(upload, owner.id)).toBe('0')
  })

  it('tells offset, length and metadata in HEAD, and lets nobody keep the answer', async () => {
    const upload = await begin(episode.id, owner.id, 10)
    await send(upload, owner.id, 0, bytes(4))
    const answer = await tusCall('HEAD', { as: owner.id, upload })
    expect(answer.status).toBe(200)
    expect(answer.headers.get('upload-offset')).toBe('4')
    expect(answer.headers.get('upload-length')).toBe('10')
    expect(answer.headers.get('cache-control')).toBe('no-store')
    expect(answer.headers.get('tus-resumable')).toBe('1.0.0')
    expect(answer.headers.get('upload-metadata')?.split(',').sort()).toEqual(metadataFor(episode.id).split(',').sort())
  })

  it('has no offset for what is not there', async () => {
    for (const upload of ['7f9c24e8-3b1d-4d5a-9d0c-111111111111', '..%2f..%2fetc', 'x']) {
      const answer = await tusCall('HEAD', { as: owner.id, upload })
      expect([400, 404]).toContain(answer.status)
      expect(answer.headers.get('upload-offset')).toBeNull()
      expect(answer.headers.get('tus-resumable')).toBe('1.0.0')
    }
  })

  it('takes bytes at the offset, and only there', async () => {
    const film = bytes(30)
    const upload = await begin(episode.id, owner.id, 30)
    const first = await send(upload, owner.id, 0, film.subarray(0, 10))
    expect([first.status, first.headers.get('upload-offset')]).toEqual([204, '10'])
    expect((await send(upload, owner.id, 0, film.subarray(0, 10))).status).toBe(409)
    expect((await send(upload, owner.id, 20, film.subarray(20))).status).toBe(409)
    expect(await offsetOf(upload, owner.id)).toBe('10')
    const rest = await send(upload, owner.id, 10, film.subarray(10))
    expect(rest.headers.get('upload-offset')).toBe('30')
    expect(Buffer.compare(await stored(upload), film)).toBe(0)
  })

  it('takes no other type than application/offset+octet-stream', async () => {
    const upload = await begin(episode.id, owner.id, 4)
    expect((await send(upload, owner.id, 0, bytes(4), { 'content-type': 'video/mp4' })).status).toBe(415)
    expect(await offsetOf(upload, owner.id)).toBe('0')
  })

  it('never takes more than was announced', async () => {
    const upload = await begin(episode.id, owner.id, 4)
    expect((await send(upload, owner.id, 0, bytes(9))).status).toBeGreaterThanOrEqual(400)
    expect(Number(await offsetOf(upload, owner.id))).toBeLessThanOrEqual(4)
  })

  it('means the verb that X-HTTP-Method-Override names', async () => {
    const upload = await begin(episode.id, owner.id, 4)
    const headers = { 'x-http-method-override': 'PATCH', 'upload-offset': '0', ...chunkType }
    expect((await tusCall('POST', { as: owner.id, upload, headers, body: bytes(4) })).status).toBe(204)
    expect(await offsetOf(upload, owner.id)).toBe('4')
  })
})

describe('the creation extension', () => {
  it('answers 201 with a Location and the day on which it expires', async () => {
    const headers = { 'upload-length': '100', 'upload-metadata': metadataFor(episode.id) }
    const answer = await tusCall('POST', { as: owner.id, headers })
    expect(answer.status).toBe(201)
    expect(answer.headers.get('location')).toMatch(/^\/api\/footage\/[0-9a-f-]{36}$/)
    expect(Date.parse(answer.headers.get('upload-expires') ?? '')).toBeGreaterThan(Date.now() + 6 * 24 * 3600_000)
  })

  it.each(['-1', 'abc', '1e3', '', '99999999999999999'])('refuses the length %j', async (length) => {
    const before = await Footage.count()
    const headers = { 'upload-length': length, 'upload-metadata': metadataFor(episode.id) }
    expect((await tusCall('POST', { as: owner.id, headers })).status).toBe(400)
    expect(await Footage.count()).toBe(before)
  })

  it('refuses more than the most with 413, and a length to be told later', async () => {
    const before = await Footage.count()
    const most = { 'upload-length': String(env().FOOTAGE_MAX_BYTES + 1), 'upload-metadata': metadataFor(episode.id) }
    expect((await tusCall('POST', { as: owner.id, headers: most })).status).toBe(413)
    const later = { 'upload-defer-length': '1', 'upload-metadata': metadataFor(episode.id) }
    expect((await tusCall('POST', { as: owner.id, headers: later })).status).toBe(400)
    expect(await Footage.count()).toBe(before)
  })

  it.each([
    ['missing', null],
    ['not base64', 'episodeId %%%'],
    ['given twice', 'filename YQ==,filename Yg=='],
  ])('refuses metadata that is %s', async (_what, metadata) => {
    const headers: Record<string, string> = {
      'upload-length': '1',
      ...(metadata === null ? {} : { 'upload-metadata': metadata }),
    }
    expect((await tusCall('POST', { as: owner.id, headers })).status).toBe(400)
  })

  it('takes the first bytes with the creation, and an empty file as arrived', async () => {
    const headers = { 'upload-length': '8', 'upload-metadata': metadataFor(episode.id), ...chunkType }
    const answer = await tusCall('POST', { as: owner.id, headers, body: bytes(3) })
    expect([answer.status, answer.headers.get('upload-offset')]).toEqual([201, '3'])
    const empty = await begin(episode.id, owner.id, 0)
    expect((await Footage.findByPk(empty))?.state).toBe('inspecting')
  })

  it('keeps a hostile file name as words and nothing else', async () => {
    const headers = {
      'upload-length': '1',
      'upload-metadata': metadataFor(episode.id, '../../etc/\u202Epasswd\n%03d.mp4'),
    }
    const upload = uploadIdOf(await tusCall('POST', { as: owner.id, headers }))
    expect((await Footage.findByPk(upload))?.filename).toBe('../../etc/passwd%03d.mp4')
    expect(await readdir(join(env().MEDIA_ROOT, 'uploads'))).toContain(upload)
  })
})

describe('the checksum extension', () => {
  it('takes a chunk that arrived whole', async () => {
    const film = bytes(20)
    const upload = await begin(episode.id, owner.id, 20)
    const answer = await send(upload, owner.id, 0, film, { 'upload-checksum': sha1(film) })
    expect([answer.status, answer.headers.get('upload-offset')]).toEqual([204, '20'])
    expect(Buffer.compare(await stored(upload), film)).toBe(0)
  })

  it('answers 460 to a chunk that arrived changed, and throws it away', async () => {
    const upload = await begin(episode.id, owner.id, 20)
    const answer = await send(upload, owner.id, 0, bytes(20), { 'upload-checksum': sha1(bytes(20)) })
    expect(answer.status).toBe(460)
    expect(await offsetOf(upload, owner.id)).toBe('0')
    expect(await readdir(join(env().MEDIA_ROOT, 'incoming'))).toEqual([])
  })

  it('answers 400 to an algorithm that it does not have', async () => {
    const upload = await begin(episode.id, owner.id, 20)
    const answer = await send(upload, owner.id, 0, bytes(20), { 'upload-checksum': 'crc32 AAAAAA==' })
    expect(answer.status).toBe(400)
    expect(await offsetOf(upload, owner.id)).toBe('0')
  })
})

describe('the termination and expiration extensions', () => {
  it('frees an unfinished upload with 204, and knows it no more', async () => {
    const upload = await begin(episode.id, owner.id, 20)
    await send(upload, owner.id, 0, bytes(5))
    expect((await tusCall('DELETE', { as: owner.id, upload })).status).toBe(204)
    expect((await tusCall('HEAD', { as: owner.id, upload })).status).toBe(404)
    expect((await send(upload, owner.id, 5, bytes(5))).status).toBe(404)
    expect(await readdir(join(env().MEDIA_ROOT, 'uploads'))).not.toContain(upload)
    expect(await Footage.findByPk(upload)).toBeNull()
  })

  it('removes no film that has arrived', async () => {
    const upload = await begin(episode.id, owner.id, 5)
    await send(upload, owner.id, 0, bytes(5))
    expect((await tusCall('DELETE', { as: owner.id, upload })).status).toBe(403)
    expect(await stored(upload)).toHaveLength(5)
  })

  it('forgets what nobody finished in time, bytes and all', async () => {
    const upload = await begin(episode.id, owner.id, 20)
    await send(upload, owner.id, 0, bytes(5))
    await Footage.update({ expiresAt: new Date(Date.now() - 1000) }, { where: { id: upload } })
    await reconcileFootage()
    expect((await tusCall('HEAD', { as: owner.id, upload })).status).toBe(404)
    expect((await readdir(join(env().MEDIA_ROOT, 'uploads'))).filter((name) => name.startsWith(upload))).toEqual([])
  })
})
