import { drawDemoFilm } from '@/lib/demo/jobs'
import { publishDue } from '@/lib/episodes/jobs'
import { encodeFootage, inspectFootage, reconcileUploads } from '@/lib/footage/jobs'
import { hearTerms } from '@/lib/handbook/jobs'
import { sendLetter } from '@/lib/mail/jobs'
import { refreshSearch } from '@/lib/search/jobs'
import type { Job } from './queue'

type Body<T> = (data: T) => Promise<unknown>
export type Registered = { job: Job<never>; load: () => Promise<Body<never>>; cron?: string }

const on = <T>(job: Job<T>, load: () => Promise<Body<T>>, cron?: string): Registered => ({
  job: job as unknown as Job<never>,
  load,
  cron,
})

/** Every kind of job and the body that does it. Bodies are loaded when the first such job arrives, and only in the worker. */
export const registry: readonly Registered[] = [
  on(drawDemoFilm, async () => (await import('@/lib/demo/draw-demo-film')).drawAndSend),
  on(publishDue, async () => (await import('@/lib/episodes/publish-due')).publishWhatIsDue, '* * * * *'),
  on(encodeFootage, async () => (await import('@/lib/footage/encode-footage')).encodeFootageById),
  on(inspectFootage, async () => (await import('@/lib/footage/inspect-footage')).inspectFootageById),
  on(reconcileUploads, async () => (await import('@/lib/footage/reconcile-uploads')).reconcileFootage, '* * * * *'),
  on(hearTerms, async () => (await import('@/lib/handbook/hear-terms')).hearTermsInEpisode),
  on(refreshSearch, async () => (await import('@/lib/search/refresh-search')).refreshSearchOf),
  on(sendLetter, async () => (await import('@/lib/mail/send-letter')).sendLetterById),
]
