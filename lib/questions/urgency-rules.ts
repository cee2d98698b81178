import { dayNumber, dayOf, type Day } from '@/lib/dates/rules'
import type { Crop } from '@/lib/topics/crops'
import type { StageKey } from '@/lib/topics/stage-words'

/** From when to when a crop stands in a stage somewhere on the channel; both days included. */
export type SeasonWindow = { crop: Crop; stage: StageKey; startsOn: Day; endsOn: Day }

/**
 * How long an answer is still of use.
 * `now`: the stage is there, `days` until its last day. `ahead`: it begins later this season. `over`: it has passed,
 * and comes again about a year later. `unknown`: no stage was given, or the channel has set no dates for it.
 */
export type Useful = { kind: 'now' | 'ahead' | 'over'; days: number; until: Day } | { kind: 'unknown' }

const byStart = (a: SeasonWindow, b: SeasonWindow) => a.startsOn.localeCompare(b.startsOn)

/** The last day of the run of windows that overlap one another from the first on: fields of one season, not of the next. */
const endOfRun = (ordered: readonly SeasonWindow[]): Day =>
  ordered.reduce(
    (end, { startsOn, endsOn }) => (startsOn <= end && endsOn > end ? endsOn : end),
    ordered[0]?.endsOn ?? '',
  )

/**
 * How long an answer about this stage is of use on this channel. Of several fields the one that lasts longest counts:
 * the answer is late only when it is late for all of them.
 * @param today in the channel's time zone
 */
export function usefulUntil(
  asked: { crop: Crop | null; stage: StageKey | null },
  windows: readonly SeasonWindow[],
  today: Day,
): Useful {
  const fitting = windows
    .filter(({ crop, stage }) => stage === asked.stage && (!asked.crop || crop === asked.crop))
    .toSorted(byStart)
  const coming = fitting.filter(({ endsOn }) => endsOn >= today)
  const [next] = coming
  if (next) {
    const until = endOfRun(coming)
    return { kind: next.startsOn <= today ? 'now' : 'ahead', days: dayNumber(until) - dayNumber(today), until }
  }
  const last = fitting.reduce<Day | null>((end, { endsOn }) => (end && end > endsOn ? end : endsOn), null)
  return last ? yearsOn(last, today) : { kind: 'unknown' }
}

/** A stage that is over comes again about a year later. */
function yearsOn(last: Day, today: Day): Useful {
  const missed = dayNumber(today) - dayNumber(last)
  const again = dayNumber(last) + Math.ceil(missed / 365) * 365
  return { kind: 'over', days: again - dayNumber(today), until: dayOf(again) }
}

/** Counted as far off as this when nobody knows how long the stage lasts. Common practice, no source: one season. */
const UNKNOWN_DAYS = 90
/** Weeks of waiting after which it counts no more: old questions rise, but do not bury the field. Common practice, no source. */
const MOST_WEEKS = 8

/**
 * The order of the queue: (people asking + weeks waited, at most 8) × haste, the largest first. Haste is
 * 1 + 14 / (days left + 7): 3 on a stage's last day, 2 a week before it, 1.5 three weeks before, hardly above 1 for
 * next season. Common practice, no source: it is ours, and said on the screen with the queue.
 * @param daysLeft until the answer stops being of use; null when unknown
 */
export function urgencyOf(asked: { daysLeft: number | null; asking: number; waitedDays: number }): number {
  const weeks = Math.min(MOST_WEEKS, Math.max(0, asked.waitedDays) / 7)
  const haste = 1 + 14 / (Math.max(0, asked.daysLeft ?? UNKNOWN_DAYS) + 7)
  return (asked.asking + weeks) * haste
}

/** The same in words, for the desk. */
export const urgencyExplained =
  'People asking plus weeks waited (at most 8), times haste: 3 on the last day of the stage, 2 a week before it, hardly more than 1 for next season.'

const monthOf = (day: Day) =>
  new Intl.DateTimeFormat('en', { month: 'long', timeZone: 'UTC' }).format(new Date(`${day}T00:00:00Z`))

/** Up to here days are counted; after it the month says more. */
const COUNTED_DAYS = 60

/** "4 days", "last day", "until July", "next March"; months and not seasons of the year, which differ by hemisphere. */
export function usefulWords(useful: Useful): string {
  if (useful.kind === 'unknown') return 'any time'
  if (useful.kind === 'over') return `next ${monthOf(useful.until)}`
  if (useful.days === 0) return 'last day'
  if (useful.days <= COUNTED_DAYS) return useful.days === 1 ? '1 day' : `${useful.days} days`
  return `until ${monthOf(useful.until)}`
}

/** The same as a sentence for the viewer's pages. */
export function usefulSentence(useful: Useful): string {
  if (useful.kind === 'unknown') return 'Useful at any time'
  if (useful.kind === 'over') return `Useful again next ${monthOf(useful.until)}`
  if (useful.days === 0) return 'Useful until today'
  if (useful.days > COUNTED_DAYS) return `Useful until ${monthOf(useful.until)}`
  return `Useful for ${useful.days === 1 ? '1 more day' : `${useful.days} more days`}`
}
