import { z } from 'zod'
import { defineJob } from '@/lib/jobs/queue'

/** Draws one film of the demo and sends it on as footage. Queued by the seed alone. */
export const drawDemoFilm = defineJob('demo.draw', z.object({ footageId: z.uuid(), episode: z.string() }), {
  retryLimit: 3,
  expireInSeconds: 1800,
})
