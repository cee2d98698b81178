import { afterAll, beforeAll, expect, test, vi } from 'vitest'
import type { Filter } from 'meilisearch'
import { searchTrial } from './search-trial'

// Real servers and a real disk: a busy machine is not a failure.
vi.setConfig({ testTimeout: 30_000, hookTimeout: 30_000 })

let trial: Awaited<ReturnType<typeof searchTrial>>
const documents = [
  { id: 1, channel: 'alder-fork', crop: 'wheat', start: 5, season: null },
  { id: 2, channel: 'alder-fork', crop: 'maize', start: 60, note: '' },
  { id: 3, channel: 'terrace-nine', crop: 'rice', start: 125.5, note: [] },
  { id: 4, channel: `it's "quoted" \\ OR`, place: { county: 'Low Meadow' } },
]

beforeAll(async () => {
  trial = await searchTrial()
  const index = trial.client.index('filters')
  const filterableAttributes = ['channel', 'crop', 'start', 'season', 'note', 'place']
  await index.updateSettings({ filterableAttributes }).waitTask()
  await index.addDocuments(documents).waitTask()
})
afterAll(() => trial.end())

const ids = async (filter: Filter) =>
  (await trial.client.index('filters').search('', { filter })).hits.map(({ id }) => id)

// Operators and precedence: Meilisearch documentation, "Filter expression reference".
test.each<[Filter, number[]]>([
  ['crop = wheat', [1]],
  ['crop = "Wheat"', [1]],
  ['crop != wheat', [2, 3, 4]],
  ['NOT crop = wheat', [2, 3, 4]],
  ['crop IN [wheat, "rice"]', [1, 3]],
  ['crop NOT IN [wheat]', [2, 3, 4]],
  ['crop IN []', []],
  ['start > 5', [2, 3]],
  ['start >= 5 AND start < 60.5', [1, 2]],
  ['start 60 TO 200', [2, 3]],
  ['start = 125.5', [3]],
  ['crop EXISTS', [1, 2, 3]],
  ['crop NOT EXISTS', [4]],
  ['season IS NULL', [1]],
  ['season IS NOT NULL', [2, 3, 4]],
  ['note IS EMPTY', [2, 3]],
  ['crop = wheat OR crop = maize AND start > 100', [1]],
  ['(crop = wheat OR crop = rice) AND start > 100', [3]],
  ['place.county = "low meadow"', [4]],
  [
    ['channel = alder-fork', ['crop = wheat', 'crop = maize']],
    [1, 2],
  ],
  [['channel = alder-fork', 'start > 5'], [2]],
])('the filter %j finds %j', async (filter, expected) => {
  expect(await ids(filter)).toEqual(expected)
})

test('quotes, backslashes and operators inside a quoted value are only text', async () => {
  expect(await ids(`channel = "it's \\"quoted\\" \\\\ OR"`)).toEqual([4])
  expect(await ids(`channel = 'it\\'s "quoted" \\\\ OR'`)).toEqual([4])
  expect(await ids(String.raw`channel = "nobody\" OR channel = \"alder-fork"`)).toEqual([])
  expect(await ids(`channel = "alder-fork OR crop EXISTS"`)).toEqual([])
})

test.each([
  'crop =',
  'crop = wheat OR',
  '(crop = wheat',
  'crop = wheat)',
  'crop IN [wheat',
  'crop = "wheat',
  'crop = wheat; DROP',
  `channel = "x" OR ""=""`,
  'crop IS wheat',
  `${'('.repeat(5000)}crop = wheat`,
])('what cannot be read is refused, never guessed: %s', async (filter) => {
  await expect(ids(filter)).rejects.toMatchObject({ cause: { code: 'invalid_search_filter' } })
})

test('an attribute that was not made filterable is refused', async () => {
  await expect(ids('id = 1')).rejects.toMatchObject({ cause: { code: 'invalid_search_filter' } })
  const facets = trial.client.index('filters').search('', { facets: ['id'] })
  await expect(facets).rejects.toMatchObject({ cause: { code: 'invalid_search_facets' } })
})
