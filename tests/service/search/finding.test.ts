import { beforeAll, describe, expect, it } from 'vitest'
import { GET } from '@/app/api/search/route'
import { rebuildSearch } from '@/lib/search/rebuild-search'
import type { SearchResult } from '@/lib/search/schema'
import { Answer } from '@/models/answer'
import type { Channel } from '@/models/channel'
import { Claim } from '@/models/claim'
import { Explainer } from '@/models/explainer'
import { Season } from '@/models/season'
import { Term } from '@/models/term'
import { makeCaptions, makeChannel, makeChapter, makeEpisode, makeFilm, makeQuestion, makeUser } from '../../factories'
import { freshDatabase } from '../../support/database'
import { call } from '../../support/requests'
import { freshSearch } from '../../support/search'

freshDatabase()
freshSearch()

const ask = (query: string) => call(GET as never, `/api/search?${query}`)
const search = async (query: string) => (await (await ask(query)).json()) as SearchResult
const titles = async (query: string) => (await search(query)).items.map(({ title }) => title)

let alder: Channel
let standUrl: string

beforeAll(async () => {
  alder = await makeChannel({ slug: 'alder', name: 'Alder Fork Farm' })
  const terrace = await makeChannel({ slug: 'terrace', name: 'Terrace Nine' })
  const season = await Season.create({ channelId: alder.id, year: 2026 })
  const published = { state: 'published' as const, publishedAt: new Date('2026-03-20') }

  const stand = await makeEpisode(alder, {
    ...published,
    title: 'Worth keeping?',
    slug: 'stand',
    number: 9,
    seasonId: season.id,
  })
  standUrl = '/channels/alder/episodes/stand'
  await makeFilm(stand, 300_000)
  await makeChapter(stand, 60_000, 'Why we count now', ['wheat-21', 'job-scouting'])
  await makeChapter(stand, 160_000, 'Throwing the hoop', ['wheat-13', 'subject-weather'])
  await makeCaptions(stand, [
    [1_000, 4_000, 'Good morning from the river bottom.'],
    [62_000, 66_000, 'Three nights of hard frost on wheat that was barely tillering.'],
    [90_500, 94_000, 'Count before you worry about brown leaf tips.'],
    [161_000, 165_000, 'Toss the hoop over your shoulder.'],
  ])

  const paddy = await makeEpisode(terrace, { ...published, title: 'Letting the water in', slug: 'water', number: 2 })
  await makeFilm(paddy, 120_000)
  await makeChapter(paddy, 0, 'Opening the gate', ['rice-21', 'job-levees'])
  await makeCaptions(paddy, [[5_000, 9_000, 'The paddy takes four inches of water before tillering.']])

  const draft = await makeEpisode(terrace, { title: 'Secret harvest plans', slug: 'plans' })
  await makeChapter(draft, 0, 'Secret frost talk', ['rice-89'])
  await makeCaptions(draft, [[0, 2_000, 'Nobody may find this secret tillering talk.']])

  const june = await makeUser()
  const open = { title: 'What hoop size in narrow rows?', crop: 'wheat', stage: 'wheat-21', state: 'queued' as const }
  await makeQuestion(alder, june, { ...open, episodeId: stand.id, atMs: 170_000 })
  const answered = await makeQuestion(alder, june, {
    title: 'Do dead tillers count?',
    body: 'The crown is white.',
    state: 'answered',
    answeredAt: new Date(),
  })
  const range = { startMs: 92_500, endMs: 94_000, text: 'Only if the crown is firm.' }
  await Answer.create({ questionId: answered.id, episodeId: stand.id, ...range })
  await makeQuestion(alder, june, { title: 'Rude frost question', state: 'set-aside', setAsideReason: 'rude' })

  const field = 'Planting and growth'
  await Term.create({
    slug: 'crown',
    label: 'Crown',
    definition: 'The short stem at the soil surface.',
    field,
    synonyms: ['crowns'],
  })
  const heat = await Explainer.create({
    slug: 'heat-units',
    title: 'Counting heat units',
    body: 'Add **each day** above {{claim:base}} to the [sum](https://x.example).',
  })
  await Claim.create({
    explainerId: heat.id,
    key: 'base',
    statement: 'Maize counts from here.',
    low: 50,
    high: 50,
    unit: '°F',
  })
  await rebuildSearch()
})

describe('words', () => {
  it('lead to the second at which they are spoken, not to the start of the film', async () => {
    const { items } = await search('q=worry+brown')
    expect(items[0]).toMatchObject({
      kind: 'passage',
      title: 'Why we count now',
      snippet: 'Count before you worry about brown leaf tips.',
      url: `${standUrl}?t=90.5`,
      start: 90.5,
      end: 160,
      stage: '2',
      crop: 'wheat',
      episode: { number: 9, title: 'Worth keeping?', channel: { slug: 'alder', name: 'Alder Fork Farm' } },
    })
  })

  it('are marked in the snippet as places, so that no text is ever read as markup', async () => {
    const [item] = (await search('q=hoop+shoulder')).items
    expect(item?.marks.map(([from, to]) => item.snippet.slice(from, to))).toEqual(['hoop', 'shoulder'])
    expect(item?.snippet).toBe('Toss the hoop over your shoulder.')
  })

  it('may hold a typing slip', async () => {
    expect(await titles('q=tilering')).toContain('Why we count now')
  })

  it('before the first chapter are found under the episode itself', async () => {
    expect((await search('q=river+bottom')).items[0]).toMatchObject({
      kind: 'passage',
      title: 'Worth keeping?',
      url: `${standUrl}?t=1`,
    })
  })

  it('find an answered question at the second of its follow-up, an open one on its own page', async () => {
    const { items } = await search('q=&kind=question')
    const [open, answered] = [
      items.find(({ state }) => state === 'queued'),
      items.find(({ state }) => state === 'answered'),
    ]
    expect(answered).toMatchObject({ url: `${standUrl}?t=92.5`, start: 92.5, end: 94, title: 'Do dead tillers count?' })
    expect(open?.url).toMatch(/^\/questions\/[0-9a-f-]{36}$/)
    expect(items).toHaveLength(2)
    expect(await titles('q=firm+crown&kind=question')).toEqual(['Do dead tillers count?'])
  })

  it('find terms by their other names, and explainers by what is read of them', async () => {
    expect((await search('q=crowns&kind=term')).items[0]).toMatchObject({
      title: 'Crown',
      url: '/handbook/terms/crown',
    })
    const [explainer] = (await search('q=heat+units&kind=explainer')).items
    expect(explainer).toMatchObject({
      url: '/handbook/explainers/heat-units',
      snippet: 'Add each day above 50 °F to the sum.',
    })
  })
})

describe('what is not public', () => {
  it('is never found: drafts of any channel, questions set aside', async () => {
    for (const word of ['secret', 'Nobody', 'rude', 'plans']) expect(await titles(`q=${word}`)).toEqual([])
    const { facets } = await search('q=')
    expect(facets.stage).not.toHaveProperty('rice-89')
    expect(facets.kind).toEqual({ episode: 2, explainer: 1, passage: 4, question: 2, term: 1 })
  })

  it('is not found by its own desk either: this is the public search', async () => {
    const person = await makeUser({ isAdmin: true })
    const answer = await call(GET as never, '/api/search?q=secret', { as: person.id })
    expect(((await answer.json()) as SearchResult).items).toEqual([])
  })
})

describe('choices', () => {
  it('narrow by a whole stage code or by the principal stage above it', async () => {
    expect(await titles('q=&kind=passage&stage=wheat-21')).toEqual(['Why we count now'])
    expect(await titles('q=&kind=passage&stage=wheat-2')).toEqual(['Why we count now'])
    expect(await titles('q=&kind=passage&crop=wheat&stage=21')).toEqual(['Why we count now'])
    expect((await titles('q=&kind=passage&stage=2')).sort()).toEqual(['Opening the gate', 'Why we count now'])
    expect(await titles('q=&kind=passage&stage=wheat-3')).toEqual([])
  })

  it('narrow by crop, job, subject, season and channel', async () => {
    expect(await titles('q=&kind=passage&crop=rice')).toEqual(['Opening the gate'])
    expect(await titles('q=&kind=passage&job=job-scouting')).toEqual(['Why we count now'])
    expect(await titles('q=&kind=passage&job=scouting')).toEqual(['Why we count now'])
    expect(await titles('q=&kind=passage&subject=subject-weather')).toEqual(['Throwing the hoop'])
    expect(await titles('q=&kind=episode&season=2026')).toEqual(['Worth keeping?'])
    expect(await titles('q=tillering&channel=terrace&kind=passage')).toEqual(['Opening the gate'])
    expect(await titles('q=tillering&channel=nowhere')).toEqual([])
  })

  it('are counted, the one already made as if it were open', async () => {
    const { facets, total } = await search('q=&kind=passage&crop=wheat')
    expect(total).toBe(2)
    expect(facets.crop).toEqual({ rice: 1, wheat: 2 })
    expect(facets.stage).toEqual({ 'wheat-1': 1, 'wheat-13': 1, 'wheat-2': 1, 'wheat-21': 1 })
    expect(facets.kind).toMatchObject({ passage: 2, question: 1 })
  })

  it('that are not understood are refused by name', async () => {
    for (const [query, path] of [
      ['crop=unicorn', 'crop'],
      ['stage=rice-31', 'stage'],
      ['stage=21', 'stage'],
      ['crop=rice&stage=wheat-21', 'stage'],
      ['kind=film', 'kind'],
      ['season=last', 'season'],
      ['limit=0', 'limit'],
      ['colour=green', ''],
    ]) {
      const answer = await ask(query ?? '')
      const problem = (await answer.json()) as { errors: { path: string }[] }
      expect([answer.status, problem.errors[0]?.path], query).toEqual([400, path])
    }
  })

  it('left open by a form are open', async () => {
    expect((await ask('q=hoop&crop=&stage=&job=&subject=&season=&kind=&channel=')).status).toBe(200)
  })

  it('cannot be talked out of by quotes in the words or in a choice', async () => {
    expect((await ask(`channel=${encodeURIComponent('alder" OR channel = "terrace')}`)).status).toBe(400)
    expect(await titles(`q=${encodeURIComponent('" OR kind = "passage')}&kind=term`)).toEqual([])
  })
})

it('pages follow each other without a gap', async () => {
  const seen: string[] = []
  let cursor: string | null = ''
  while (cursor !== null) {
    const page: SearchResult = await search(`q=&limit=3&cursor=${cursor}`)
    expect(page.total).toBe(10)
    seen.push(...page.items.map(({ id }) => id))
    cursor = page.nextCursor
  }
  expect(new Set(seen).size).toBe(10)
  expect(seen).toHaveLength(10)
  expect((await ask('q=&cursor=bogus')).status).toBe(400)
})
