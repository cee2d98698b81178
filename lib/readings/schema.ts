import { z } from 'zod'
import { line, paragraph, seconds } from '@/lib/episodes/schema'

export const readingInput = z.object({
  at: seconds,
  quantity: line(80),
  value: z.number(),
  unit: z.string().trim().max(40),
  note: paragraph(300).nullish(),
})
export const readingsInput = z.array(readingInput).max(200)
export type ReadingsInput = z.infer<typeof readingsInput>
