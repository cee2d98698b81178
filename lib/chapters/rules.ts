import { topicByCode } from '@/lib/topics/rules'

type Broken = { path: string; message: string }
type Draft = { start: number; title: string; topics: string[] }

/** A chapter too short to be landed on is a slip of the hand. */
export const SHORTEST_SECONDS = 2

const at = (index: number, field: string, message: string): Broken => ({ path: `chapters.${index}.${field}`, message })

function starts(chapters: Draft[], duration: number | null): Broken[] {
  return chapters.flatMap(({ start }, n) => {
    const before = chapters[n - 1]
    if (before && start <= before.start)
      return [at(n, 'start', 'Chapters must be in order, each starting later than the one before.')]
    if (before && start - before.start < SHORTEST_SECONDS)
      return [at(n, 'start', `A chapter lasts at least ${SHORTEST_SECONDS} s.`)]
    if (duration !== null && start > duration - SHORTEST_SECONDS && start > 0)
      return [
        at(
          n,
          'start',
          `The film ends at ${duration.toFixed(1)} s; a chapter needs at least ${SHORTEST_SECONDS} s of it.`,
        ),
      ]
    return []
  })
}

function titles(chapters: Draft[]): Broken[] {
  const seen = new Set<string>()
  return chapters.flatMap(({ title }, n) => {
    const key = title.toLocaleLowerCase()
    if (seen.has(key)) return [at(n, 'title', 'Two chapters have this title.')]
    seen.add(key)
    return []
  })
}

const topics = (chapters: Draft[]): Broken[] =>
  chapters.flatMap((chapter, n) =>
    chapter.topics.flatMap((code, m) =>
      topicByCode(code) ? [] : [at(n, `topics.${m}`, `“${code}” is not a topic. See /api/topics.`)],
    ),
  )

/**
 * What is wrong with a list of chapters. @param duration of the film in seconds, null while it is not known
 * A film may begin before the first chapter: that stretch is its untitled opening.
 */
export const brokenChapters = (chapters: Draft[], duration: number | null): Broken[] => [
  ...starts(chapters, duration),
  ...titles(chapters),
  ...topics(chapters),
]
