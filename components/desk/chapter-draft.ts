import type { ChapterView, EpisodeView } from '@/lib/episodes/views'
import { parseTime, writeTime } from '@/lib/times/parse'

/** A chapter while it is being worked on: the start as typed, so that a half-written time is not lost. */
export type ChapterDraft = { key: string; start: string; title: string; topics: string[] }

let made = 0
const freshKey = () => `new-${++made}`

export const draftOf = ({ start, title, topics }: ChapterView): ChapterDraft => ({
  key: freshKey(),
  start: writeTime(start),
  title,
  topics: topics.map(({ code }) => code),
})

export const draftsOf = ({ chapters }: EpisodeView): ChapterDraft[] => chapters.map(draftOf)

/** A new chapter at a second, put where it belongs; it takes over the topics of the stretch it is cut from. */
export function startHere(drafts: ChapterDraft[], second: number): ChapterDraft[] {
  const place = drafts.findIndex(({ start }) => (parseTime(start) ?? 0) > second)
  const at = place === -1 ? drafts.length : place
  const topics = drafts[at - 1]?.topics ?? []
  return drafts.toSpliced(at, 0, { key: freshKey(), start: writeTime(second), title: '', topics })
}

export const without = (drafts: ChapterDraft[], key: string) => drafts.filter((draft) => draft.key !== key)

export const changed = (drafts: ChapterDraft[], key: string, part: Partial<ChapterDraft>): ChapterDraft[] =>
  drafts.map((draft) => (draft.key === key ? { ...draft, ...part } : draft))

/** By start; what is not a time stays where it is typed. */
export const inOrder = (drafts: ChapterDraft[]): ChapterDraft[] =>
  drafts.toSorted((a, b) => (parseTime(a.start) ?? Infinity) - (parseTime(b.start) ?? Infinity))

/** What is wrong with a row before anything is sent. */
export function faultOf({ start, title }: ChapterDraft): { start?: string; title?: string } {
  return {
    ...(parseTime(start) === null ? { start: 'Write a time such as 3:12.' } : {}),
    ...(title.trim() === '' ? { title: 'Give it a title.' } : {}),
  }
}

export const isSound = (draft: ChapterDraft): boolean => Object.keys(faultOf(draft)).length === 0

export const chaptersBody = (drafts: ChapterDraft[]) => ({
  chapters: inOrder(drafts).map(({ start, title, topics }) => ({ start: parseTime(start) ?? 0, title, topics })),
})
