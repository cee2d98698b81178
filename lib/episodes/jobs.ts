import { z } from 'zod'
import { defineJob } from '@/lib/jobs/queue'

/** Publishes what is scheduled and due. Runs at the hour set and every minute, so that a lost one is made up for. */
export const publishDue = defineJob('episodes.publish-due', z.object({}))
