import { z } from 'zod'
import { pageOf } from '@/lib/http/paging'
import { crops, stageKeys } from './rules'

export const topicKinds = ['stage', 'job', 'subject'] as const

/** Unlike other lists this one answers whole unless a limit is asked: a picker needs it whole, and it never grows. */
export const topicsQuery = z.object({
  crop: z.enum(crops).optional(),
  kind: z.enum(topicKinds).optional(),
  cursor: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(100).optional(),
})
export type TopicsQuery = z.infer<typeof topicsQuery>

export const topicsOutput = pageOf(
  z.object({
    code: z.string(),
    label: z.string(),
    kind: z.enum(topicKinds),
    crop: z.enum(crops).nullable(),
    bbch: z.string().nullable().describe('one digit for a principal stage, two for a stage'),
    stage: z.enum(stageKeys).nullable(),
    hazardous: z.literal(true).optional(),
  }),
)
