import type { ChapterView } from '@/lib/episodes/views'
import { stageOf, type Topic, topicByCode } from '@/lib/topics/rules'
import type { Chapter } from '@/models/chapter'
import type { ChapterTopic } from '@/models/chapter-topic'

export type LoadedChapter = Chapter & { topics: ChapterTopic[] }

/** Chapters in order; each ends where the next starts, the last with the film. */
export function chapterViews(rows: LoadedChapter[], durationMs: number | null): ChapterView[] {
  const ordered = [...rows].sort((a, b) => a.startMs - b.startMs)
  return ordered.map((row, n) => {
    const codes = row.topics.map(({ code }) => code)
    const endMs = ordered[n + 1]?.startMs ?? Math.max(durationMs ?? row.startMs, row.startMs)
    return {
      start: row.startMs / 1000,
      end: endMs / 1000,
      title: row.title,
      topics: codes.map(topicByCode).filter((topic): topic is Topic => topic !== null),
      stage: stageOf(codes),
    }
  })
}
