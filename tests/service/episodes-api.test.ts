import { beforeAll, describe, expect, it } from 'vitest'
import { GET as list, POST as create } from '@/app/api/channels/[channel]/episodes/route'
import { PUT as putChapters } from '@/app/api/episodes/[id]/chapters/route'
import { GET as read, PATCH as patch } from '@/app/api/episodes/[id]/route'
import type { EpisodeView } from '@/lib/episodes/views'
import type { Channel } from '@/models/channel'
import { Episode } from '@/models/episode'
import type { User } from '@/models/user'
import { makeChannel, makeChapter, makeEpisode, makeFilm, makeMember, makeUser } from '../factories'
import { freshDatabase } from '../support/database'
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
