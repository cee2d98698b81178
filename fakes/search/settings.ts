import { z } from 'zod'
import { badRequest } from './errors'

const names = z.array(z.string())
const rule = z.union([
  z.enum(['words', 'typo', 'proximity', 'attribute', 'attributeRank', 'wordPosition', 'sort', 'exactness']),
  z.string().regex(/^.+:(asc|desc)$/),
])

/** The settings that change what is found, with their documented defaults. */
const shape = z.object({
  displayedAttributes: names.default(['*']),
  searchableAttributes: names.default(['*']),
  filterableAttributes: names.default([]),
  sortableAttributes: names.default([]),
  rankingRules: z.array(rule).default(['words', 'typo', 'proximity', 'attribute', 'sort', 'exactness']),
  stopWords: names.default([]),
  synonyms: z.record(z.string(), names).default({}),
  distinctAttribute: z.string().nullable().default(null),
  typoTolerance: z
    .object({
      enabled: z.boolean().default(true),
      minWordSizeForTypos: z
        .object({ oneTypo: z.int().min(0).max(255).default(5), twoTypos: z.int().min(0).max(255).default(9) })
        .default({ oneTypo: 5, twoTypos: 9 }),
      disableOnWords: names.default([]),
      disableOnAttributes: names.default([]),
      disableOnNumbers: z.boolean().default(false),
    })
    .prefault({}),
  faceting: z
    .object({
      maxValuesPerFacet: z.int().min(1).default(100),
      sortFacetValuesBy: z.record(z.string(), z.enum(['alpha', 'count'])).default({ '*': 'alpha' }),
    })
    .prefault({}),
  pagination: z.object({ maxTotalHits: z.int().min(1).default(1000) }).prefault({}),
})

export type Settings = z.infer<typeof shape>
export type SettingName = keyof Settings

export const defaultSettings = (): Settings => shape.parse({})

/** `filterable-attributes` in the address of a single setting is `filterableAttributes` in the object. */
export function settingNamed(slug: string): SettingName | null {
  const name = slug.replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase())
  return name in shape.shape ? (name as SettingName) : null
}

/** Checks a change. What is left out stays; `null` puts the default back. Throws 400 naming the setting. */
export function settingsChange(change: unknown): Partial<Settings> {
  if (change === null || typeof change !== 'object' || Array.isArray(change))
    throw badRequest('Settings are an object.')
  const defaults = defaultSettings()
  const entries = Object.entries(change).map(([name, value]: [string, unknown]) => {
    if (!(name in shape.shape)) throw badRequest(`Unknown field \`${name}\`.`)
    const key = name as SettingName
    if (value === null) return [key, defaults[key]]
    const read = shape.shape[key].safeParse(value)
    const code = `invalid_settings_${name.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`)}`
    if (!read.success) throw badRequest(`Invalid value at \`.${name}\`: ${read.error.issues[0]?.message}`, code)
    return [key, read.data]
  })
  return Object.fromEntries(entries) as Partial<Settings>
}
