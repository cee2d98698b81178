import { z } from 'zod'
import { pageQuery } from '@/lib/http/paging'

/** Text as people type it: one Unicode form, no blanks around, no control characters. */
export const line = (most: number) =>
  z
    .string()
    .transform((value) => value.normalize('NFC').replace(/\s+/g, ' ').trim())
    .pipe(z.string().min(1, 'must not be empty').max(most, `at most ${most} characters`))

export const paragraph = (most: number) =>
  z
    .string()
    .transform((value) => value.normalize('NFC').trim())
    .pipe(z.string().max(most, `at most ${most} characters`))

const season = z
  .union([z.number(), z.string().regex(/^\d{4}$/)])
  .transform(Number)
  .pipe(z.number().int().min(1900).max(2200))
const language = z.string().regex(/^[a-zA-Z]{2,3}(-[a-zA-Z0-9]{2,8})*$/, 'a language tag such as en or es-MX')

/** Positions and lengths are seconds with millisecond precision. */
export const seconds = z
  .number()
  .min(0)
  .max(7 * 24 * 3600)
  .transform((value) => Math.round(value * 1000) / 1000)

export const idParams = z.object({ id: z.uuid() })
export const channelParams = z.object({ channel: z.string().min(1).max(80) })
export const languageParams = idParams.extend({ language })

export const episodeInput = z.object({
  title: line(120),
  filmedOn: z.iso.date().nullish(),
  summary: paragraph(2000).nullish(),
  season: season.nullish(),
  language: language.default('en'),
})
export type EpisodeInput = z.infer<typeof episodeInput>

export const episodePatch = z
  .object({
    title: line(120),
    filmedOn: z.iso.date().nullable(),
    summary: paragraph(2000).nullable(),
    season: season.nullable(),
    language,
    /** Somebody at the desk has read the cautions of the hazardous jobs and stands for them. */
    cautionsConfirmed: z.boolean(),
  })
  .partial()
  .strict()
export type EpisodePatch = z.infer<typeof episodePatch>

export const episodesQuery = pageQuery.extend({
  season: z
    .string()
    .regex(/^\d{4}$/)
    .optional(),
  crop: z.string().max(20).optional(),
  stage: z.string().max(20).optional(),
  job: z.string().max(40).optional(),
  subject: z.string().max(40).optional(),
  state: z.enum(['draft', 'scheduled', 'published', 'withdrawn']).optional(),
})
export type EpisodesQuery = z.infer<typeof episodesQuery>

export const publishInput = z.object({ at: z.iso.datetime({ offset: true }).nullish() })
export type PublishInput = z.infer<typeof publishInput>

export const correctionInput = z.object({ at: seconds, said: line(300), right: line(600) })
export type CorrectionInput = z.infer<typeof correctionInput>
export { language as languageTag }
