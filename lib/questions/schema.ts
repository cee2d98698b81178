import { z } from 'zod'
import { line, paragraph, seconds } from '@/lib/episodes/schema'
import { pageOf, pageQuery } from '@/lib/http/paging'
import { crops } from '@/lib/topics/crops'
import { topicByCode } from '@/lib/topics/rules'
import { ANSWER_MOST, BODY_MOST, TITLE_MOST } from './limits'
import type { DrawnPhoto } from './redraw-photos'
import { questionStates } from './rules'

const words = (most: number) => paragraph(most).pipe(z.string().min(1, 'must not be empty'))

const stage = z.string().refine((code) => topicByCode(code)?.kind === 'stage', 'not a stage of the BBCH keys')

const ruleBroken = (message: string, path: string) => ({ message, path: [path], params: { rule: true } })

/** `POST /api/questions`. `at` is the second of the episode; crop and stage are filled in from it where left out. */
export const askInput = z
  .object({
    channel: z.string().min(1).max(80),
    title: line(TITLE_MOST),
    body: paragraph(BODY_MOST).default(''),
    episodeId: z.uuid().nullish(),
    at: seconds.nullish(),
    crop: z.enum(crops).nullish(),
    stage: stage.nullish(),
  })
  .refine(
    ({ at, episodeId }) => at === undefined || at === null || Boolean(episodeId),
    ruleBroken('needs episodeId', 'at'),
  )
  .refine(
    ({ crop, stage: code }) => {
      const of = code ? topicByCode(code)?.crop : null
      return !crop || !of || of === crop
    },
    ruleBroken('this stage belongs to another crop', 'stage'),
  )
export type AskInput = z.infer<typeof askInput>

/** A question on its way in: as JSON it brings no photos, as a form up to four of them. */
export type Asking = { input: AskInput; photos: readonly DrawnPhoto[] }
export const askForm = askInput.transform((input): Asking => ({ input, photos: [] }))

export const photoParams = z.object({ name: z.string().regex(/^[0-9a-f-]{36}\.webp$/) })

export const questionParams = z.object({ id: z.uuid() })

const stateList = z
  .string()
  .max(80)
  .transform((list) => list.split(','))
  .pipe(z.array(z.enum(questionStates)))

export const questionSorts = ['urgency', 'asking', 'newest'] as const
export type QuestionSort = (typeof questionSorts)[number]

/** `state` takes one state or several with commas between. */
export const questionsQuery = pageQuery.extend({
  channel: z.string().max(80).optional(),
  state: stateList.optional(),
  episode: z.uuid().optional(),
  crop: z.enum(crops).optional(),
  sort: z.enum(questionSorts).default('newest'),
})
export type QuestionsQuery = z.infer<typeof questionsQuery>

export const similarQuery = z.object({
  channel: z.string().min(1).max(80).optional(),
  q: z.string().trim().max(400),
  limit: z.coerce.number().int().min(1).max(20).default(8),
})
export type SimilarQuery = z.infer<typeof similarQuery>

export const joinInput = z.object({ into: z.uuid() })
export const setAsideInput = z.object({ reason: words(500) })
export const askDetailInput = z.object({ message: words(2000) })
export const toAdviserInput = z.object({ note: paragraph(2000).default('') })
export const bookInput = z.object({ episodeId: z.uuid() })
export const answerInput = z
  .object({ episodeId: z.uuid(), start: seconds, end: seconds, text: words(ANSWER_MOST) })
  .refine(({ start, end }) => end > start, ruleBroken('must be after the start', 'end'))
export type AnswerInput = z.infer<typeof answerInput>
export const verdictInput = z.object({ settled: z.boolean(), note: paragraph(1000).nullish() })
export type VerdictInput = z.infer<typeof verdictInput>

const episodeRef = z.object({ id: z.string(), number: z.number(), title: z.string(), url: z.string() })

/** What a question looks like from outside. Positions in seconds. */
export const questionOutput = z.object({
  id: z.string(),
  url: z.string(),
  channel: z.object({ slug: z.string(), name: z.string() }),
  title: z.string(),
  body: z.string(),
  state: z.enum(questionStates),
  asking: z.number(),
  youAreAsking: z.boolean(),
  askedBy: z.string().nullable(),
  askedAt: z.string(),
  episode: episodeRef.nullable(),
  at: z.number().nullable(),
  crop: z.enum(crops).nullable(),
  stage: z.string().nullable(),
  usefulUntil: z.string().nullable(),
  photos: z.array(z.object({ url: z.string(), width: z.number(), height: z.number(), alt: z.string() })),
  answeredAt: z.string().nullable(),
  followUp: episodeRef.extend({ channel: z.string(), start: z.number(), end: z.number(), text: z.string() }).nullable(),
  joinedInto: z.object({ id: z.string(), title: z.string(), url: z.string() }).nullable(),
  setAsideReason: z.string().nullable(),
})

export const questionPage = pageOf(questionOutput)

export const likenessOutput = z.object({
  items: z.array(
    z.object({
      kind: z.enum(['question', 'passage']),
      score: z.number(),
      title: z.string(),
      url: z.string(),
      id: z.string().optional(),
      state: z.enum(questionStates).optional(),
      asking: z.number().optional(),
      snippet: z.string().optional(),
      start: z.number().optional(),
      end: z.number().optional(),
    }),
  ),
  nextCursor: z.null(),
})

export const askingOutput = z.object({ asking: z.number(), youAreAsking: z.boolean() })

/** An id out of a page's address; one that cannot be an id finds nothing, instead of failing in the database. */
export const questionIdOf = (text: string): string =>
  z.uuid().safeParse(text).success ? text : '00000000-0000-0000-0000-000000000000'
