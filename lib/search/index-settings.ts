import type { Settings } from 'meilisearch'

/** The one index of all that can be found. */
export const INDEX = 'turnrow'

/** Words that stand in nearly every sentence. "No", "till" and "off" are words of the trade and stay. */
const stopWords =
  'a an and are as at be by for from how in is it of on or that the this to was we what when with'.split(' ')

/** Names of one thing lead to each other. Terms bring their own other names in `words`. */
const sameThing = [
  ['corn', 'maize'],
  ['soybean', 'soybeans', 'soya'],
  ['rice', 'paddy'],
  ['no till', 'direct drilling'],
]

const synonyms = Object.fromEntries(
  sameThing.flatMap((names) => names.map((name) => [name, names.filter((other) => other !== name)])),
)

/** What is searched in which order, counted and sorted by. Changing it takes `npm run reindex`. */
export const indexSettings = {
  searchableAttributes: ['title', 'spoken', 'text', 'words'],
  filterableAttributes: ['kind', 'source', 'channel', 'crops', 'stages', 'stageKeys', 'jobs', 'subjects', 'season'],
  sortableAttributes: ['day'],
  rankingRules: ['words', 'typo', 'proximity', 'attribute', 'sort', 'exactness', 'day:desc'],
  stopWords,
  synonyms,
  typoTolerance: { disableOnNumbers: true },
  faceting: { maxValuesPerFacet: 400 },
} satisfies Settings
