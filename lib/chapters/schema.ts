import { z } from 'zod'
import { line, seconds } from '@/lib/episodes/schema'

export const chaptersInput = z.object({
  chapters: z
    .array(z.object({ start: seconds, title: line(60), topics: z.array(z.string().max(40)).max(12).default([]) }))
    .max(200),
})
export type ChaptersInput = z.infer<typeof chaptersInput>
