import { beforeAll, describe, expect, it } from 'vitest'
import { POST as publish } from '@/app/api/episodes/[id]/publish/route'
import { DELETE as remove, GET as read, PATCH as patch } from '@/app/api/episodes/[id]/route'
import { GET as walkRound } from '@/app/api/episodes/[id]/walk-round/route'
import { POST as withdraw } from '@/app/api/episodes/[id]/withdraw/route'
import type { Channel } from '@/models/channel'
import { Episode } from '@/models/episode'
import type { User } from '@/models/user'
import { makeCaptions, makeChannel, makeChapter, makeEpisode, makeFilm, makeMember } from '../factories'
import { freshDatabase } from '../support/database'
import { waitingJobs } from '../support/jobs'
import { call } from '../support/requests'

freshDatabase()

let channel: Channel
let owner: User

beforeAll(async () => {
  channel = await makeChannel()
  owner = await makeMember(channel, 'owner')
})

const on = (episode: { id: string }) => ({ id: episode.id })

describe('publishing', () => {
  const ready = async () => {
    const episode = await makeEpisode(channel)
    await makeFilm(episode)
    await makeChapter(episode, 0, 'All of it', ['wheat-21'])
    await makeCaptions(episode, [[0, 2000, 'Count what lives.']])
    return episode
  }
  const send = (episode: Episode, body: object = {}, as = owner.id) =>
    call(publish, `/api/episodes/${episode.id}/publish`, {
      body,
      as,
      params: on(episode),
      headers: { 'if-match': '"1"' },
    })

  it('is refused with the failing lines of the walk-round', async () => {
    const bare = await makeEpisode(channel)
    const refused = await send(bare)
    expect(refused.status).toBe(422)
    const { errors } = (await refused.json()) as { errors: { path: string }[] }
    const looked = await call(walkRound, `/api/episodes/${bare.id}/walk-round`, { as: owner.id, params: on(bare) })
    const lines = (await looked.json()) as { rule: string; ok: boolean }[]
    expect(errors.map(({ path }) => path)).toEqual(lines.filter(({ ok }) => !ok).map(({ rule }) => rule))
    expect(errors.map(({ path }) => path)).toEqual(['footage', 'chapters', 'topics', 'captions'])
  })

  it('asks for cautions of a hazardous job first', async () => {
    const episode = await ready()
    await makeChapter(episode, 30_000, 'Spraying', ['job-spraying'])
    expect(await (await send(episode)).json()).toMatchObject({ status: 422, errors: [{ path: 'cautions' }] })
    await call(patch, `/api/episodes/${episode.id}`, {
      method: 'PATCH',
      body: { cautionsConfirmed: true },
      as: owner.id,
      params: on(episode),
      headers: { 'if-match': '"1"' },
    })
    const now = await call(publish, `/api/episodes/${episode.id}/publish`, {
      body: {},
      as: owner.id,
      params: on(episode),
      headers: { 'if-match': '"2"' },
    })
    expect(now.status).toBe(200)
  })

  it('shows the episode to everybody and asks for search and terms in the same commit', async () => {
    const episode = await ready()
    expect((await send(episode)).status).toBe(200)
    expect((await call(read, `/api/episodes/${episode.id}`, { params: on(episode) })).status).toBe(200)
    const jobs = await waitingJobs()
    expect(
      jobs
        .filter(({ data }) => data.id === episode.id || data.episodeId === episode.id)
        .map(({ name }) => name)
        .sort(),
    ).toEqual(['handbook.hear', 'search.refresh'])
    expect((await send(episode)).status).toBe(409)
  })

  it('waits for its hour when one is given, and is not seen before', async () => {
    const episode = await ready()
    const at = new Date(Date.now() + 3600_000).toISOString()
    expect(await (await send(episode, { at })).json()).toMatchObject({ state: 'scheduled', publishAt: at })
    expect((await call(read, `/api/episodes/${episode.id}`, { params: on(episode) })).status).toBe(404)
    const { publishWhatIsDue } = await import('@/lib/episodes/publish-due')
    await publishWhatIsDue()
    expect((await Episode.findByPk(episode.id))?.state).toBe('scheduled')
    await Episode.update({ publishAt: new Date(Date.now() - 1000) }, { where: { id: episode.id } })
    await Promise.all([publishWhatIsDue(), publishWhatIsDue()])
    const after = await Episode.findByPk(episode.id)
    expect(after).toMatchObject({ state: 'published', edition: 3 })
  })

  it('is undone by withdrawing: gone for everybody else, kept at the desk, never deleted', async () => {
    const episode = await ready()
    await send(episode)
    const out = await call(withdraw, `/api/episodes/${episode.id}/withdraw`, {
      method: 'POST',
      as: owner.id,
      params: on(episode),
    })
    expect(await out.json()).toMatchObject({ state: 'withdrawn' })
    expect((await call(read, `/api/episodes/${episode.id}`, { params: on(episode) })).status).toBe(404)
    const gone = await call(remove, `/api/episodes/${episode.id}`, {
      method: 'DELETE',
      as: owner.id,
      params: on(episode),
    })
    expect(gone.status).toBe(409)
  })
})
