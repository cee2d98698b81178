import { chapterAt } from '@/lib/captions/rules'

type Stretch = { start: number; end: number }
type Place = { at: number; duration: number }

/** Seconds that an arrow key moves. Common practice, no source. */
export const arrowSeconds = 5
/** Going back within this many seconds of a chapter's start goes to the one before. From memory. */
const justStarted = 2

/** Where a key moves the needle, or null for a key that is not one of its own. Seconds. */
export function placeAfterKey(key: string, { at, duration }: Place, chapters: readonly Stretch[]): number | null {
  switch (key) {
    case 'ArrowLeft':
    case 'ArrowDown':
      return Math.max(0, at - arrowSeconds)
    case 'ArrowRight':
    case 'ArrowUp':
      return Math.min(duration, at + arrowSeconds)
    case 'Home':
      return 0
    case 'End':
      return duration
    case 'PageDown':
      return chapters.find((chapter) => chapter.start > at + 0.01)?.start ?? duration
    case 'PageUp':
      return startBefore(at, chapters)
    default:
      return null
  }
}

function startBefore(at: number, chapters: readonly Stretch[]): number {
  const current = chapterAt(chapters, at)
  const start = current === null ? undefined : chapters[current]?.start
  const from = start !== undefined && at - start > justStarted ? at : (start ?? at)
  return chapters.findLast((chapter) => chapter.start < from)?.start ?? 0
}
