import { z } from 'zod'
import { defineJob } from '@/lib/jobs/queue'

export const searchSources = ['episode', 'question', 'term', 'explainer'] as const

/**
 * Something changed that people search: the index looks at it again. An episode stands for all its passages and for
 * the questions asked on it or answered by it. Many tries, because a search that is down for an hour must catch up.
 */
export const refreshSearch = defineJob('search.refresh', z.object({ kind: z.enum(searchSources), id: z.uuid() }), {
  retryLimit: 14,
  expireInSeconds: 120,
  // A refresh mostly waits for the search; a handbook that is loaded brings dozens.
  atOnce: 4,
})
