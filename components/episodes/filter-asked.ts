import { crops, topicByCode } from '@/lib/topics/rules'

const names = ['season', 'crop', 'stage', 'job', 'subject', 'cursor'] as const

export type EpisodeFilter = Partial<Record<(typeof names)[number], string>>

/** What would filter everything away without saying why: no year, no topic of ours. */
const isKnown: Record<(typeof names)[number], (value: string) => boolean> = {
  season: (value) => /^\d{4}$/.test(value),
  crop: (value) => crops.some((crop) => crop === value),
  stage: (value) => topicByCode(value)?.kind === 'stage' || /^\d{1,2}$/.test(value),
  job: (value) => topicByCode(value.startsWith('job-') ? value : `job-${value}`) !== null,
  subject: (value) => topicByCode(value.startsWith('subject-') ? value : `subject-${value}`) !== null,
  cursor: () => true,
}

/** The filter in a page's address. What is empty, given twice or too long to be one of ours is as if it were not there. */
export function filterAsked(query: Record<string, string | string[] | undefined>): EpisodeFilter {
  return Object.fromEntries(
    names.flatMap((name) => {
      const value = query[name]
      if (typeof value !== 'string' || value === '' || value.length > 200) return []
      return isKnown[name](value) ? [[name, value]] : []
    }),
  )
}
