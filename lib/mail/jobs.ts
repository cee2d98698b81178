import { z } from 'zod'
import { defineJob } from '@/lib/jobs/queue'

export const sendLetter = defineJob('mail.send', z.object({ id: z.uuid() }), {
  retryLimit: 12,
  expireInSeconds: 60,
  atOnce: 4,
})
