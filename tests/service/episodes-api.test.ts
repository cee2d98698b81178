import { beforeAll, describe, expect, it } from 'vitest'
import { GET as list, POST as create } from '@/app/api/channels/[channel]/episodes/route'
import { PUT as putChapters } from '@/app/api/episodes/[id]/chapters/route'
import { POST as publish } from '@/app/api/episodes/[id]/publish/route'
import { DELETE as remove, GET as read, PATCH as patch } from '@/app/api/episodes/[id]/route'
import { GET as walkRound } from '@/app/api/episodes/[id]/walk-round/route'
import { POST as withdraw } from '@/app/api/episodes/[id]/withdraw/route'
import type { EpisodeView } from '@/lib/episodes/views'
import type { Channel } from '@/models/channel'
import { Episode } from '@/models/episode'
import type { User } from '@/models/user'
import { makeCaptions, makeChannel, makeChapter, makeEpisode, makeFilm, makeMember, makeUser } from '../factories'
import { freshDatabase } from '../support/database'
import { waitingJobs } from '../support/jobs'
import { call } from '../support/requests'

freshDatabase()

let channel: Channel
let owner: User
let adviser: User
let stranger: User
let otherOwner: User

beforeAll(async () => {
  channel = await makeChannel()
  owner = await makeMember(channel, 'owner')
  adviser = await makeMember(channel, 'adviser')
  otherOwner = await makeMember(await makeChannel(), 'owner')
  stranger = await makeUser()
})

const make = (title: string, as?: string, headers?: Record<string, string>) =>
  call(create, `/api/channels/${channel.slug}/episodes`, {
    body: { title },
    as,
    headers,
    params: { channel: channel.slug },
  })

const on = (episode: { id: string }) => ({ id: episode.id })

describe('making an episode', () => {
  it('answers 401 to nobody, 403 to who may not, 201 with an ETag to the owner', async () => {
    expect((await make('Nobody')).status).toBe(401)
    expect((await make('Stranger', stranger.id)).status).toBe(403)
    expect((await make('Adviser', adviser.id)).status).toBe(403)
    const made = await make('Setting the drill', owner.id)
    expect(made.status).toBe(201)
    expect(made.headers.get('etag')).toBe('"1"')
    expect(await made.json()).toMatchObject({ slug: 'setting-the-drill', state: 'draft', title: 'Setting the drill' })
  })

  it('gives twenty identical requests with one Idempotency-Key one episode and one answer', async () => {
    const asked = Array.from({ length: 20 }, () => make('Only once', owner.id, { 'idempotency-key': 'once-1' }))
    const answers = await Promise.all(asked)
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([201]))
    const ids = await Promise.all(answers.map(async (answer) => ((await answer.json()) as EpisodeView).id))
    expect(new Set(ids).size).toBe(1)
    expect(await Episode.count({ where: { title: 'Only once' } })).toBe(1)
  })

  it('refuses a key that comes back with another body', async () => {
    await make('First words', owner.id, { 'idempotency-key': 'reused' })
    expect((await make('Other words', owner.id, { 'idempotency-key': 'reused' })).status).toBe(422)
  })

  it('numbers episodes made at the same moment apart', async () => {
    const made = await Promise.all([1, 2, 3, 4].map(() => make('Side by side', owner.id)))
    const views = (await Promise.all(made.map((one) => one.json()))) as EpisodeView[]
    expect(new Set(views.map(({ number }) => number)).size).toBe(4)
    expect(new Set(views.map(({ slug }) => slug)).size).toBe(4)
  })

  it('says by field what is wrong with a body', async () => {
    const answer = await make('', owner.id)
    expect(answer.status).toBe(400)
    expect(answer.headers.get('content-type')).toContain('application/problem+json')
    expect(await answer.json()).toMatchObject({ status: 400, errors: [{ path: 'title' }] })
  })

  it('refuses a write that a browser sends from another site', async () => {
    expect((await make('Forged', owner.id, { origin: 'https://elsewhere.example' })).status).toBe(403)
  })
})

describe('a draft', () => {
  it('is not found by anybody outside its desk', async () => {
    const draft = await makeEpisode(channel)
    for (const as of [undefined, stranger.id, otherOwner.id])
      expect((await call(read, `/api/episodes/${draft.id}`, { as, params: on(draft) })).status).toBe(404)
    expect((await call(read, `/api/episodes/${draft.id}`, { as: adviser.id, params: on(draft) })).status).toBe(200)
  })

  it('is edited only against the edition that was read', async () => {
    const draft = await makeEpisode(channel)
    const edit = (title: string, etag?: string) =>
      call(patch, `/api/episodes/${draft.id}`, {
        method: 'PATCH',
        body: { title },
        as: owner.id,
        params: on(draft),
        headers: etag ? { 'if-match': etag } : {},
      })
    expect((await edit('No edition')).status).toBe(428)
    const [one, two] = await Promise.all([edit('First', '"1"'), edit('Second', '"1"')])
    expect([one.status, two.status].sort()).toEqual([200, 412])
    const lost = one.status === 412 ? one : two
    expect(await lost.json()).toMatchObject({ status: 412, current: { id: draft.id, edition: 2 } })
  })
})

describe('chapters', () => {
  const put = (episode: Episode, chapters: object[], as: string | undefined = owner.id) =>
    call(putChapters, `/api/episodes/${episode.id}/chapters`, {
      method: 'PUT',
      body: { chapters },
      as,
      params: on(episode),
      headers: { 'if-match': '"1"' },
    })

  it('are saved with their topics and end where the next one starts', async () => {
    const episode = await makeEpisode(channel)
    await makeFilm(episode, 60_000)
    const saved = await put(episode, [
      { start: 0, title: 'Why', topics: ['soil'] },
      { start: 12.5, title: 'How', topics: ['wheat-21', 'job-drilling'] },
    ])
    expect(saved.status).toBe(200)
    const { chapters } = (await saved.json()) as EpisodeView
    expect(chapters.map(({ start, end, stage }) => ({ start, end, stage }))).toEqual([
      { start: 0, end: 12.5, stage: 'soil' },
      { start: 12.5, end: 60, stage: '2' },
    ])
  })

  it.each([
    ['an invented code', [{ start: 0, title: 'A', topics: ['rice-31'] }], 'chapters.0.topics.0'],
    ['a start after the end', [{ start: 90, title: 'A', topics: [] }], 'chapters.0.start'],
    [
      'two of one title',
      [
        { start: 0, title: 'A' },
        { start: 9, title: 'a' },
      ],
      'chapters.1.title',
    ],
    [
      'starts out of order',
      [
        { start: 9, title: 'A' },
        { start: 0, title: 'B' },
      ],
      'chapters.1.start',
    ],
  ])('are refused with %s, and nothing is changed', async (_, chapters, path) => {
    const episode = await makeEpisode(channel)
    await makeFilm(episode, 60_000)
    const refused = await put(episode, chapters)
    expect(refused.status).toBe(422)
    expect(((await refused.json()) as { errors: { path: string }[] }).errors.map((one) => one.path)).toContain(path)
    expect((await Episode.findByPk(episode.id))?.edition).toBe(1)
  })

  it('are nobody else’s to write', async () => {
    const episode = await makeEpisode(channel)
    expect((await put(episode, [], adviser.id)).status).toBe(403)
    expect((await put(episode, [], otherOwner.id)).status).toBe(404)
  })
})

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

describe('the list of a channel', () => {
  it('finds episodes by crop, by principal stage and by job, and pages without gaps', async () => {
    const own = await makeChannel()
    for (const codes of [['wheat-21'], ['wheat-29', 'job-scouting'], ['maize-13']]) {
      const episode = await makeEpisode(own, { state: 'published' })
      await makeChapter(episode, 0, 'One', codes)
    }
    const titles = async (query: string) => {
      const answer = await call(list, `/api/channels/${own.slug}/episodes?${query}`, { params: { channel: own.slug } })
      return (await answer.json()) as { items: EpisodeView[]; nextCursor: string | null }
    }
    expect((await titles('crop=wheat')).items).toHaveLength(2)
    expect((await titles('stage=wheat-2')).items).toHaveLength(2)
    expect((await titles('crop=wheat&stage=21')).items).toHaveLength(1)
    expect((await titles('job=scouting')).items).toHaveLength(1)
    const first = await titles('limit=2')
    const second = await titles(`limit=2&cursor=${first.nextCursor}`)
    expect(new Set([...first.items, ...second.items].map(({ id }) => id)).size).toBe(3)
    expect(second.nextCursor).toBeNull()
    expect((await call(list, `/x?state=draft`, { params: { channel: own.slug } })).status).toBe(404)
  })
})
