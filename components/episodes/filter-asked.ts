const names = ['season', 'crop', 'stage', 'job', 'subject', 'cursor'] as const

export type EpisodeFilter = Partial<Record<(typeof names)[number], string>>

/** The filter in a page's address. What is empty, given twice or too long to be one of ours is as if it were not there. */
export function filterAsked(query: Record<string, string | string[] | undefined>): EpisodeFilter {
  return Object.fromEntries(
    names.flatMap((name) => {
      const value = query[name]
      if (typeof value !== 'string' || value === '' || value.length > 200) return []
      // A year that is none would filter everything away without saying why.
      return name === 'season' && !/^\d{4}$/.test(value) ? [] : [[name, value]]
    }),
  )
}
