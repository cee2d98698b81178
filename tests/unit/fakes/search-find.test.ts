import { afterAll, beforeAll, expect, test, vi } from 'vitest'
import type { SearchParams } from 'meilisearch'
import { passages, searchTrial, type Passage } from './search-trial'

// Real servers and a real disk: a busy machine is not a failure.
vi.setConfig({ testTimeout: 30_000, hookTimeout: 30_000 })

let trial: Awaited<ReturnType<typeof searchTrial>>
const index = () => trial.client.index<Passage>('passages')
const find = (q: string, options: SearchParams = {}) => index().search(q, options)
const ids = async (q: string, options: SearchParams = {}) => (await find(q, options)).hits.map(({ id }) => id)

beforeAll(async () => {
  trial = await searchTrial()
  await index()
    .updateSettings({
      searchableAttributes: ['title', 'text'],
      filterableAttributes: ['kind', 'stages', 'start'],
      sortableAttributes: ['start'],
      stopWords: ['the', 'of'],
      synonyms: { corn: ['maize'], 'first leaves': ['seedling'] },
    })
    .waitTask()
  await index().addDocuments(passages, { primaryKey: 'id' }).waitTask()
})
afterAll(() => trial.end())

test('a word is found in every place where it stands, the more important attribute first', async () => {
  expect(await ids('crown')).toEqual(['term-1', 'question-1'])
  expect(await ids('COUNT')).toEqual(['passage-2', 'question-1'])
})

test('the last word may be half typed, an earlier one may not', async () => {
  expect(await ids('till')).toEqual(['question-1', 'passage-2'])
  expect(await ids('till frost', { matchingStrategy: 'all' })).toEqual([])
  expect(await ids('till ')).toEqual([])
})

test('one slip is forgiven from five letters, two from nine, none below; the first letter counts as two', async () => {
  // Sizes: Meilisearch documentation, "Typo tolerance settings" (minWordSizeForTypos 5 and 9).
  expect(await ids('crwon ')).toEqual(['term-1', 'question-1'])
  expect(await ids('tilerring ')).toEqual(['passage-2'])
  expect(await ids('hop ')).toEqual([])
  expect(await ids('drown ')).toEqual([])
  expect(await ids('crrrown ')).toEqual([])
})

test('a word as it stands comes before one with a slip', async () => {
  const other = trial.client.index('slips')
  const documents = [
    { id: 1, text: 'a tower of wheet' },
    { id: 2, text: 'a field of wheat' },
  ]
  await other.addDocuments(documents).waitTask()
  expect((await other.search('wheat')).hits.map(({ id }) => id)).toEqual([2, 1])
})

test('words that stand together come before words that stand apart', async () => {
  const other = trial.client.index('near')
  const documents = [
    { id: 1, text: 'stand back from the auger and keep a count of bags' },
    { id: 2, text: 'the stand count comes first' },
  ]
  await other.addDocuments(documents).waitTask()
  expect((await other.search('stand count')).hits.map(({ id }) => id)).toEqual([2, 1])
})

test('words are given up from the end until something is found, unless all are wanted', async () => {
  expect(await ids('hoop frost')).toEqual(['passage-1'])
  expect(await ids('hoop frost', { matchingStrategy: 'all' })).toEqual([])
  expect(await ids('crown frost', { matchingStrategy: 'frequency' })).toEqual(['passage-2'])
})

test('words in quotes stand in a row, and a word after a minus must not be there', async () => {
  expect(await ids('"hard frost"')).toEqual(['passage-2'])
  expect(await ids('"frost hard"')).toEqual([])
  expect(await ids('crown -white')).toEqual(['term-1'])
})

test('stop words are passed over and synonyms lead to each other as set', async () => {
  const other = trial.client.index('words')
  await other
    .updateSettings({ stopWords: ['the'], synonyms: { corn: ['maize'], 'no till': ['direct drilling'] } })
    .waitTask()
  const documents = [
    { id: 1, text: 'maize at knee height' },
    { id: 2, text: 'direct drilling into stubble' },
  ]
  await other.addDocuments(documents).waitTask()
  expect((await other.search('the corn')).hits.map(({ id }) => id)).toEqual([1])
  expect((await other.search('no till', { matchingStrategy: 'all' })).hits.map(({ id }) => id)).toEqual([2])
  expect((await other.search('drilling')).hits.map(({ id }) => id)).toEqual([2])
})

test('accents and other scripts are words as well', async () => {
  const other = trial.client.index('accents')
  await other
    .addDocuments([
      { id: 1, text: 'El trigo está en macollaje' },
      { id: 2, text: '小麦の分げつ' },
    ])
    .waitTask()
  expect((await other.search('esta')).hits.map(({ id }) => id)).toEqual([1])
  expect((await other.search('小麦')).hits.map(({ id }) => id)).toEqual([2])
})

test('facets count all that was found, not only the page that is shown', async () => {
  const { facetDistribution, facetStats, hits, estimatedTotalHits } = await find('', {
    facets: ['kind', 'stages', 'start'],
    limit: 1,
  })
  expect(hits).toHaveLength(1)
  expect(estimatedTotalHits).toBe(4)
  expect(facetDistribution?.kind).toEqual({ passage: 2, question: 1, term: 1 })
  expect(facetDistribution?.stages).toEqual({ 'wheat-1': 1, 'wheat-13': 1, 'wheat-2': 2, 'wheat-21': 2 })
  expect(facetStats?.start).toEqual({ min: 62, max: 160 })
})

test('pages follow each other without a gap, by offset or by number', async () => {
  const first = await ids('', { limit: 2 })
  const second = await ids('', { offset: 2, limit: 2 })
  expect([...first, ...second].sort()).toEqual(passages.map(({ id }) => id).sort())
  const page = await find('', { page: 2, hitsPerPage: 3 })
  expect(page).toMatchObject({ page: 2, totalPages: 2, totalHits: 4 })
  expect(page.hits).toHaveLength(1)
})

test('sorting puts what has no value last in both directions', async () => {
  expect((await ids('', { sort: ['start:asc'] })).slice(0, 2)).toEqual(['passage-2', 'passage-1'])
  expect((await ids('', { sort: ['start:desc'] })).slice(0, 2)).toEqual(['passage-1', 'passage-2'])
  await expect(ids('', { sort: ['title:asc'] })).rejects.toMatchObject({ cause: { code: 'invalid_search_sort' } })
})

test('found words are marked and long texts cut around them', async () => {
  const { hits } = await find('hoop shoulder', {
    attributesToHighlight: ['text'],
    attributesToCrop: ['text'],
    cropLength: 6,
    highlightPreTag: '[',
    highlightPostTag: ']',
    attributesToRetrieve: ['id'],
  })
  expect(hits[0]).toEqual({
    id: 'passage-1',
    _formatted: { id: 'passage-1', text: '…the [hoop] over your [shoulder]. Nineteen…' },
  })
  const typed = await find('hea', { attributesToHighlight: ['text'] })
  expect(typed.hits[0]?._formatted?.text).toContain('<em>hea</em>dland')
})

test('a score between nought and one goes down along the results', async () => {
  const { hits } = await find('crown white', { showRankingScore: true })
  const scores = hits.map(({ _rankingScore }) => _rankingScore ?? -1)
  expect(hits.length).toBeGreaterThan(1)
  expect(scores).toEqual([...scores].sort((left, right) => right - left))
  expect(Math.max(...scores)).toBeLessThanOrEqual(1)
  expect(Math.min(...scores)).toBeGreaterThan(0)
  expect((await find('crown white', { rankingScoreThreshold: scores[0] ?? 0 })).hits).toHaveLength(1)
})

test('several searches go in one request', async () => {
  const { results } = await trial.client.multiSearch({
    queries: [
      { indexUid: 'passages', q: 'hoop' },
      { indexUid: 'passages', q: '', facets: ['kind'], limit: 0 },
    ],
  })
  expect(results.map(({ hits }) => hits.length)).toEqual([1, 0])
  expect(results[1]?.facetDistribution?.kind).toEqual({ passage: 2, question: 1, term: 1 })
})
