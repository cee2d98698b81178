import { Meilisearch } from 'meilisearch'
import { beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { POST as publish } from '@/app/api/episodes/[id]/publish/route'
import { POST as withdraw } from '@/app/api/episodes/[id]/withdraw/route'
import { GET } from '@/app/api/search/route'
import { nobody } from '@/lib/auth/actor'
import { env } from '@/lib/env'
import { searchDatabase } from '@/lib/search/database-reads'
import { INDEX } from '@/lib/search/index-settings'
import { readSearchPage } from '@/lib/search/page-reads'
import { rebuildSearch } from '@/lib/search/rebuild-search'
import { refreshSearchOf } from '@/lib/search/refresh-search'
import { searchQuery, type SearchResult } from '@/lib/search/schema'
import { replaceDocuments } from '@/lib/search/search-index'
import { Answer } from '@/models/answer'
import { Chapter } from '@/models/chapter'
import type { Channel } from '@/models/channel'
import { Episode } from '@/models/episode'
import { Question } from '@/models/question'
import { Term } from '@/models/term'
import type { User } from '@/models/user'
import {
  makeCaptions,
  makeChannel,
  makeChapter,
  makeEpisode,
  makeFilm,
  makeMember,
  makeQuestion,
  makeUser,
} from '../../factories'
import { freshDatabase } from '../../support/database'
import { waitingJobs, workOff } from '../../support/jobs'
import { call } from '../../support/requests'
import { freshSearch } from '../../support/search'

freshDatabase()
const service = freshSearch()

let channel: Channel
let owner: User

const ask = (query: string) => call(GET as never, `/api/search?${query}`)
const find = async (query: string) => (await (await ask(query)).json()) as SearchResult
const titles = async (query: string) => (await find(query)).items.map(({ title }) => title)

async function makeReady(title: string, words: string): Promise<Episode> {
  const episode = await makeEpisode(channel, { title })
  await makeFilm(episode)
  await makeChapter(episode, 0, `${title}, chapter`, ['wheat-21'])
  await makeCaptions(episode, [[3_000, 6_000, words]])
  return episode
}

/** Moves an episode over the API as its owner, at the edition that it has now. */
async function move(route: typeof publish, { id }: Episode): Promise<number> {
  const { edition } = await Episode.findByPk(id, { rejectOnEmpty: true })
  const headers = { 'if-match': `"${edition}"` }
  return (await call(route as never, '/', { as: owner.id, body: {}, headers, params: { id } })).status
}

beforeAll(async () => {
  channel = await makeChannel()
  owner = await makeMember(channel, 'owner')
  await rebuildSearch()
})
beforeEach(() => workOff('search.refresh'))

describe('an episode', () => {
  it('is found once it is published, and gone from the moment it is withdrawn', async () => {
    const episode = await makeReady('Greasing the auger', 'Never reach into a turning auger.')
    expect(await move(publish, episode)).toBe(200)
    expect(await titles('q=auger')).toEqual([])
    await workOff('search.refresh')
    expect((await titles('q=auger')).sort()).toEqual(['Greasing the auger', 'Greasing the auger, chapter'])

    expect(await move(withdraw, episode)).toBe(200)
    expect(await waitingJobs('search.refresh')).not.toHaveLength(0)
    expect(await find('q=auger')).toMatchObject({ items: [], total: 0 })

    await workOff('search.refresh')
    const client = new Meilisearch({ host: env().SEARCH_URL, apiKey: env().SEARCH_KEY })
    expect((await client.index(INDEX).search('auger')).hits).toEqual([])
  })

  it('loses the passages of chapters that were taken out of it', async () => {
    const episode = await makeReady('Setting the combine', 'Open the concave a little.')
    await makeChapter(episode, 30_000, 'Rotor speed', ['job-harvest'])
    await episode.update({ state: 'published', publishedAt: new Date() })
    await refreshSearchOf({ kind: 'episode', id: episode.id })
    expect(await titles('q=rotor')).toEqual(['Rotor speed'])
    await Chapter.destroy({ where: { episodeId: episode.id, title: 'Rotor speed' } })
    expect(await titles('q=rotor')).toEqual([])
    await refreshSearchOf({ kind: 'episode', id: episode.id })
    await refreshSearchOf({ kind: 'episode', id: episode.id })
    expect((await find('q=&job=harvest')).total).toBe(0)
    expect(await titles('q=concave')).toEqual(['Setting the combine, chapter'])
  })

  it('that is withdrawn takes its answers back to the page of the question', async () => {
    const asker = await makeUser()
    const episode = await makeReady('Answers in April', 'The seed goes two inches down.')
    await episode.update({ state: 'published', publishedAt: new Date() })
    const question = await makeQuestion(channel, asker, {
      title: 'How deep goes the seed?',
      state: 'answered',
      answeredAt: new Date(),
    })
    await Answer.create({
      questionId: question.id,
      episodeId: episode.id,
      startMs: 3_000,
      endMs: 6_000,
      text: 'Furrow.',
    })
    await refreshSearchOf({ kind: 'episode', id: episode.id })
    expect((await find('q=furrow&kind=question')).items[0]?.url).toContain('?t=3')
    await episode.update({ state: 'withdrawn' })
    expect((await find('q=deep&kind=question')).items[0]?.url).toBe(`/questions/${question.id}`)
    await refreshSearchOf({ kind: 'episode', id: episode.id })
    expect((await find('q=furrow&kind=question')).items).toEqual([])
  })
})

it('a question that is set aside or deleted is gone at once', async () => {
  const question = await makeQuestion(channel, owner, { title: 'Why is my sprayer dripping?' })
  await refreshSearchOf({ kind: 'question', id: question.id })
  expect(await titles('q=dripping')).toEqual(['Why is my sprayer dripping?'])
  await question.update({ state: 'set-aside', setAsideReason: 'asked twice' })
  expect(await titles('q=dripping')).toEqual([])
  await question.update({ state: 'queued', setAsideReason: null })
  expect(await titles('q=dripping')).toHaveLength(1)
  await Question.destroy({ where: { id: question.id } })
  expect(await titles('q=dripping')).toEqual([])
  await refreshSearchOf({ kind: 'question', id: question.id })
  expect((await find('q=dripping')).total).toBe(0)
})

it('an index made anew holds what the one kept up change by change held', async () => {
  const client = new Meilisearch({ host: env().SEARCH_URL, apiKey: env().SEARCH_KEY })
  const everything = async () => {
    const { results } = await client.index(INDEX).getDocuments({ limit: 1000 })
    return results.sort((left, right) => String(left.id).localeCompare(String(right.id)))
  }
  const before = await everything()
  expect(before.length).toBeGreaterThan(2)
  expect(await rebuildSearch()).toBe(before.length)
  expect(await everything()).toEqual(before)
  expect((await client.getRawIndexes()).results.map(({ uid }) => uid)).toEqual([INDEX])
})

it('a change to a search without its index makes the whole index', async () => {
  const client = new Meilisearch({ host: env().SEARCH_URL, apiKey: env().SEARCH_KEY })
  await client.deleteIndex(INDEX).waitTask({ timeout: 25_000 })
  expect((await ask('q=concave')).status).toBe(503)
  const changes = [1, 2, 3].map(() => refreshSearchOf({ kind: 'term', id: crypto.randomUUID() }))
  await Promise.all(changes)
  expect(await titles('q=concave')).toEqual(['Setting the combine, chapter'])
})

it('two changes of one thing at once leave the later one', async () => {
  const question = await makeQuestion(channel, owner, { title: 'Sprocket one?' })
  const source = { kind: 'question', id: question.id } as const
  const first = refreshSearchOf(source)
  await question.update({ title: 'Sprocket two?' })
  await Promise.all([first, refreshSearchOf(source), refreshSearchOf(source)])
  const client = new Meilisearch({ host: env().SEARCH_URL, apiKey: env().SEARCH_KEY })
  expect(await client.index(INDEX).getDocument(`question-${question.id}`)).toMatchObject({ title: 'Sprocket two?' })
})

it('a task that the search accepts and then fails makes the job fail, so that it is tried again', async () => {
  const broken = { id: 'not an id!' } as never
  await expect(replaceDocuments('episode-x', [broken])).rejects.toThrow('invalid_document_id')
})

it('where nothing is found, the nearest terms of the handbook are offered', async () => {
  await Term.create({ slug: 'crown', label: 'Crown', definition: 'A stem.', field: 'Planting and growth' })
  expect(await readSearchPage(nobody, searchQuery.parse({ q: 'corwn' }))).toMatchObject({
    items: [],
    near: [{ label: 'Crown', url: '/handbook/terms/crown' }],
  })
})

describe('with the search down', () => {
  it('the API says so and when to come back; publishing goes on, and the index catches up', async () => {
    const episode = await makeReady('Weather cocks', 'Look at the anemometer.')
    await service.stop()
    try {
      const answer = await ask('q=anemometer')
      expect(answer.status).toBe(503)
      expect(Number(answer.headers.get('retry-after'))).toBeGreaterThan(0)
      expect(answer.headers.get('content-type')).toContain('application/problem+json')
      expect(await readSearchPage(nobody, searchQuery.parse({ q: 'concave' }))).toMatchObject({
        result: null,
        items: [{ title: 'Setting the combine, chapter' }],
      })
      expect(await move(publish, episode)).toBe(200)
      await expect(workOff('search.refresh')).rejects.toThrow()
      expect(await waitingJobs('search.refresh')).not.toHaveLength(0)
    } finally {
      await service.start()
    }
    await workOff('search.refresh')
    expect(await titles('q=anemometer')).toEqual(['Weather cocks, chapter'])
  })

  it('the database finds words as typed, with the same narrowing and at the same second', async () => {
    const plain = (query: object) => searchDatabase(nobody, searchQuery.parse(query))
    const [found, ...others] = await plain({ q: 'CONCAVE littl', crop: 'wheat' })
    expect(others).toEqual([])
    expect(found).toEqual((await find('q=concave+little&crop=wheat')).items[0])
    expect(await plain({ q: 'concave', crop: 'rice' })).toEqual([])
    expect(await plain({ q: 'concave zebra' })).toEqual([])
    expect(await plain({ q: "concave' | !x & (" })).toEqual([])
    expect((await plain({ q: '', stage: 'wheat-2', kind: 'passage' })).length).toBeGreaterThan(0)
    expect((await plain({ q: 'auger' })).map(({ title }) => title)).toEqual([])
  })
})
