import { z } from 'zod'
import { crops } from '@/lib/topics/crops'
import { topicByCode } from '@/lib/topics/rules'
import { stageKeys } from '@/lib/topics/stage-words'
import { normalised } from './rules'

/** What can be found. */
export const searchKinds = ['passage', 'question', 'term', 'explainer', 'episode'] as const
export type SearchKind = (typeof searchKinds)[number]

export const LONGEST_QUERY = 200

/** A form sends what was left open as an empty value. `message` says what would have been understood. */
const open = <T extends z.ZodType>(value: T, message: string) =>
  z.union([z.literal('').transform(() => undefined), value], { error: message }).optional()

const code = (kind: 'job' | 'subject') =>
  z
    .string()
    .transform((value) => (value.startsWith(`${kind}-`) ? value : `${kind}-${value}`))
    .refine((value) => topicByCode(value)?.kind === kind)

const isStage = (value: string) =>
  topicByCode(value)?.kind === 'stage' || (stageKeys as readonly string[]).includes(value) || /^\d\d$/.test(value)

/**
 * `GET /api/search`. A stage is a code of /api/topics (`wheat-21`; `wheat-2` finds all under it), or the bare principal
 * stage of any crop, or bare digits beside a crop.
 */
export const searchQuery = z
  .strictObject({
    q: z.string().max(LONGEST_QUERY).transform(normalised).default(''),
    channel: open(z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/), 'not the slug of a channel'),
    crop: open(z.enum(crops), `one of ${crops.join(', ')}`),
    stage: open(z.string().refine(isStage), 'not a stage of /api/topics'),
    job: open(code('job'), 'not a job of /api/topics'),
    subject: open(code('subject'), 'not a subject of /api/topics'),
    season: open(z.string().regex(/^\d{4}$/), 'a year, such as 2026'),
    kind: open(z.enum(searchKinds), `one of ${searchKinds.join(', ')}`),
    limit: z.coerce.number().int().min(1).max(50).default(20),
    cursor: open(z.string().max(100), 'take it from nextCursor'),
  })
  .transform(({ stage, ...query }) => ({ ...query, ...(stage ? { stage: withCrop(stage, query.crop) } : {}) }))
  .refine(({ stage }) => stage === undefined || !/^\d\d$/.test(stage), {
    path: ['stage'],
    error: 'name the crop as well, or give the whole code such as wheat-21',
  })
  .refine(({ stage, crop }) => !stage || !crop || [null, undefined, crop].includes(topicByCode(stage)?.crop), {
    path: ['stage'],
    error: 'this stage belongs to another crop',
  })

/** `21` beside `crop=wheat` is `wheat-21`, where that crop has such a stage. */
function withCrop(stage: string, crop: string | undefined): string {
  const whole = `${crop}-${stage}`
  return topicByCode(whole) ? whole : stage
}

export type SearchQuery = z.infer<typeof searchQuery>

const counts = z.record(z.string(), z.number())

/** What one result looks like from outside. Seconds; `marks` are offsets of the found words in the snippet. */
export const searchItem = z.object({
  id: z.string(),
  kind: z.enum(searchKinds),
  title: z.string(),
  snippet: z.string(),
  marks: z.array(z.tuple([z.number(), z.number()])),
  url: z.string(),
  episode: z
    .object({
      id: z.string(),
      number: z.number(),
      title: z.string(),
      url: z.string(),
      channel: z.object({ slug: z.string(), name: z.string() }),
    })
    .optional(),
  start: z.number().optional(),
  end: z.number().optional(),
  stage: z.enum(stageKeys).nullable(),
  crop: z.enum(crops).nullable(),
  state: z.string().optional(),
})

export const searchOutput = z.object({
  items: z.array(searchItem),
  facets: z.object({
    kind: counts,
    channel: counts,
    crop: counts,
    stage: counts,
    job: counts,
    subject: counts,
    season: counts,
  }),
  total: z.number(),
  nextCursor: z.string().nullable(),
  elapsedMs: z.number(),
})

export type SearchItem = z.infer<typeof searchItem>
export type SearchResult = z.infer<typeof searchOutput>
export type FacetName = keyof SearchResult['facets']
