import { z } from 'zod'
import { defineJob } from '@/lib/jobs/queue'

const ofFootage = z.object({ footageId: z.uuid() })

/** Looks a received file over and says what it is, or why it cannot be taken. */
export const inspectFootage = defineJob('footage.inspect', ofFootage, { retryLimit: 6, expireInSeconds: 1800 })

/** Makes the film. Twenty hours is longer than six hours of film take on two cores, and ffmpeg has clocks of its own. */
export const encodeFootage = defineJob('footage.encode', ofFootage, { retryLimit: 6, expireInSeconds: 20 * 3600 })

/** Puts right what a crash left between the last byte and the row, and frees what nobody finished. */
export const reconcileUploads = defineJob('footage.reconcile', z.object({}), { retryLimit: 1, expireInSeconds: 600 })
