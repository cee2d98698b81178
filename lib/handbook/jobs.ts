import { z } from 'zod'
import { defineJob } from '@/lib/jobs/queue'

/** Captions or terms changed: find again where terms are heard in an episode. */
export const hearTerms = defineJob('handbook.hear', z.object({ episodeId: z.uuid() }))
