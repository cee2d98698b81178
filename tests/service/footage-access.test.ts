import { createHash, randomBytes } from 'node:crypto'
import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { beforeAll, describe, expect, it } from 'vitest'
import { GET as readFootageOf } from '@/app/api/episodes/[id]/footage/route'
import { env } from '@/lib/env'
import { reconcileFootage } from '@/lib/footage/reconcile-uploads'
import type { Channel } from '@/models/channel'
import type { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import type { User } from '@/models/user'
import { makeChannel, makeEpisode, makeMember, makeUser } from '../factories'
import { freshDatabase } from '../support/database'
import { waitingJobs } from '../support/jobs'
import { call } from '../support/requests'
import { begin, metadataFor, offsetOf, send, tusCall } from '../support/tus'

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

describe('who may', () => {
  it('lets only an owner or editor of the channel begin, and hides the episode from others', async () => {
    const headers = { 'upload-length': '4', 'upload-metadata': metadataFor(episode.id) }
    const adviser = await makeMember(channel, 'adviser')
    const other = await makeMember(await makeChannel(), 'owner')
    expect((await tusCall('POST', { headers })).status).toBe(401)
    expect((await tusCall('POST', { headers, as: (await makeUser()).id })).status).toBe(404)
    expect((await tusCall('POST', { headers, as: other.id })).status).toBe(404)
    expect((await tusCall('POST', { headers, as: adviser.id })).status).toBe(403)
  })

  it('shows an upload to whoever began it and to nobody else, for every verb', async () => {
    const upload = await begin(episode.id, owner.id, 4)
    const editor = await makeMember(channel, 'editor')
    const other = await makeMember(await makeChannel(), 'owner')
    expect((await tusCall('HEAD', { upload })).status).toBe(404)
    for (const as of [editor.id, other.id]) {
      expect((await tusCall('HEAD', { as, upload })).status).toBe(404)
      expect((await send(upload, as, 0, bytes(4))).status).toBe(404)
      expect((await tusCall('DELETE', { as, upload })).status).toBe(404)
    }
    expect(await offsetOf(upload, owner.id)).toBe('0')
  })

  it('ends with the role: who was taken off the channel sends nothing more', async () => {
    const leaving = await makeMember(channel, 'editor')
    const upload = await begin(episode.id, leaving.id, 4)
    const { Membership } = await import('@/models/membership')
    await Membership.destroy({ where: { userId: leaving.id } })
    expect((await send(upload, leaving.id, 0, bytes(4))).status).toBe(404)
  })
})

describe('what follows the last byte', () => {
  it('is one job, however often the end is heard of', async () => {
    const film = bytes(12)
    const upload = await begin(episode.id, owner.id, 12)
    await send(upload, owner.id, 0, film)
    await send(upload, owner.id, 12, new Uint8Array())
    await reconcileFootage()
    const jobs = (await waitingJobs('footage.inspect')).filter(({ data }) => data.footageId === upload)
    expect(jobs).toHaveLength(1)
    expect((await Footage.findByPk(upload))?.state).toBe('inspecting')
    expect(
      createHash('sha256')
        .update(await stored(upload))
        .digest('hex'),
    ).toBe(createHash('sha256').update(film).digest('hex'))
  })

  it('is made up for when the server died between the last byte and the row', async () => {
    const upload = await begin(episode.id, owner.id, 6)
    await send(upload, owner.id, 0, bytes(6))
    const { db } = await import('@/lib/db')
    await Footage.update({ state: 'receiving' }, { where: { id: upload } })
    await db().query(`delete from pgboss.job where data->>'footageId' = $1`, { bind: [upload] })
    await reconcileFootage()
    expect((await Footage.findByPk(upload))?.state).toBe('inspecting')
    expect((await waitingJobs('footage.inspect')).filter(({ data }) => data.footageId === upload)).toHaveLength(1)
  })

  it('is told to the desk as it comes in', async () => {
    const waiting = await makeEpisode(channel)
    const upload = await begin(waiting.id, owner.id, 8)
    await send(upload, owner.id, 0, bytes(6))
    const answer = await call(readFootageOf, '/', { as: owner.id, params: { id: waiting.id } })
    expect(await answer.json()).toMatchObject({ state: 'receiving', progress: 0.75, received: 6, bytes: 8 })
  })

  it('is shown to the desk alone', async () => {
    const ask = (as?: string) =>
      call(readFootageOf, `/api/episodes/${episode.id}/footage`, { as, params: { id: episode.id } })
    const answer = await ask(owner.id)
    expect(answer.status).toBe(200)
    expect(await answer.json()).toMatchObject({ state: 'inspecting', progress: 0, renditions: [] })
    expect((await ask()).status).toBe(404)
    expect((await ask((await makeUser()).id)).status).toBe(404)
    const untouched = await makeEpisode(channel)
    const none = await call(readFootageOf, '/', { as: owner.id, params: { id: untouched.id } })
    expect(none.status).toBe(404)
  })
})
