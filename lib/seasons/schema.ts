import { z } from 'zod'
import { crops } from '@/lib/topics/crops'
import { stageKeys } from '@/lib/topics/stage-words'

export const seasonYear = z.coerce.number().int().min(1900).max(2200)

/** The year in a page's address; null when none is named, and for what is no year, so that an old link still opens. */
export function yearAsked(value: string | string[] | undefined): number | null {
  const read = seasonYear.safeParse(value)
  return read.success ? read.data : null
}

export const stageWindowInput = z.object({
  stage: z.enum(stageKeys),
  startsOn: z.iso.date('Give a day as year, month and day'),
  endsOn: z.iso.date('Give a day as year, month and day'),
})

export const plantingInput = z.object({
  crop: z.enum(crops),
  field: z.string().trim().min(1, 'Name the field').max(60, 'Keep the name under 60 characters'),
  areaAcres: z.number().positive('The area is above 0').max(1_000_000).nullable().default(null),
  plantedOn: z.iso.date('Give a day as year, month and day').nullable().default(null),
  windows: z.array(stageWindowInput).max(40),
})

/** A whole season as the desk saves it: what is not in it any more is gone. */
export const seasonInput = z.object({ plantings: z.array(plantingInput).max(60) })

export const newSeasonInput = z.object({ year: seasonYear })

export const channelParams = z.object({ channel: z.string() })
export const seasonParams = channelParams.extend({ year: seasonYear })

export const seasonOutput = z.object({
  id: z.string(),
  year: z.number(),
  edition: z.number(),
  plantings: z.array(plantingInput.extend({ id: z.string() })),
})

export const seasonsOutput = z.object({ items: z.array(z.object({ year: z.number() })), nextCursor: z.null() })

export type StageWindowInput = z.infer<typeof stageWindowInput>
export type PlantingInput = z.infer<typeof plantingInput>
export type SeasonInput = z.infer<typeof seasonInput>
