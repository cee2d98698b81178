/** A calendar day as `yyyy-mm-dd`. It has no hour and no zone, so no change of the clocks can move it. */
export type Day = string

const DAY_MS = 86_400_000

/** Days since 1 January 1970. @throws RangeError when the text is no calendar day */
export function dayNumber(day: Day): number {
  const time = /^\d{4}-\d{2}-\d{2}$/.test(day) ? Date.parse(`${day}T00:00:00Z`) : Number.NaN
  const number = time / DAY_MS
  // Date.parse takes 30 February for 1 or 2 March.
  if (!Number.isInteger(number) || dayOf(number) !== day) throw new RangeError(`${day} is no calendar day`)
  return number
}

/** The calendar day that `dayNumber` counted. */
export const dayOf = (number: number): Day => new Date(number * DAY_MS).toISOString().slice(0, 10)

export const addDays = (day: Day, days: number): Day => dayOf(dayNumber(day) + days)

export const yearOf = (day: Day): number => Number(day.slice(0, 4))

/** The day it is on the farm. `timeZone` is an IANA name. */
export function todayIn(timeZone: string, at: Date): Day {
  const parts = new Intl.DateTimeFormat('en', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit' })
    .formatToParts(at)
    .map(({ type, value }) => [type, value])
  const { year, month, day } = Object.fromEntries(parts) as Record<string, string>
  return `${year}-${month}-${day}`
}

/** The first days of the months from the one of `from` to the one of `to`, both included. */
export function monthsBetween(from: Day, to: Day): Day[] {
  const months: Day[] = []
  const last = to.slice(0, 7)
  let [year, month] = from.split('-').map(Number) as [number, number]
  for (let at = from.slice(0, 7); at <= last;) {
    months.push(`${at}-01`)
    if (++month > 12) [year, month] = [year + 1, 1]
    at = `${String(year).padStart(4, '0')}-${String(month).padStart(2, '0')}`
  }
  return months
}

/** How many days lie between two days of the year, whatever the years: 30 December and 2 January are 3 apart. */
export function daysApartInYear(a: Day, b: Day): number {
  const year = yearOf(a)
  // 29 February stands as 1 March in a year without it.
  const inYear = (other: number) => Date.UTC(other, Number(b.slice(5, 7)) - 1, Number(b.slice(8))) / DAY_MS
  return Math.min(...[year - 1, year, year + 1].map((other) => Math.abs(inYear(other) - dayNumber(a))))
}

const written = (day: Day, options: Intl.DateTimeFormatOptions, language: string) =>
  new Intl.DateTimeFormat(language === 'en' ? 'en-GB' : language, { ...options, timeZone: 'UTC' }).format(
    dayNumber(day) * DAY_MS,
  )

/** `18 March`. */
export const dayAndMonth = (day: Day, language = 'en') => written(day, { day: 'numeric', month: 'long' }, language)

/** `18 March 2026`. */
export const fullDay = (day: Day, language = 'en') =>
  written(day, { day: 'numeric', month: 'long', year: 'numeric' }, language)

/** `Mar`, for the head of a column; `Sep` in three letters like the others, which British English would give four. */
export const shortMonth = (day: Day, language = 'en') =>
  written(day, { month: 'short' }, language === 'en' ? 'en-US' : language)
