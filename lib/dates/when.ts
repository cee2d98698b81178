/** A moment as people say it on the farm: `Friday 3 April, 06:00`, in the channel's time zone. */
export function dateAndTime(iso: string, timeZone: string, language = 'en-GB'): string {
  const at = new Date(iso)
  const day = new Intl.DateTimeFormat(language, { timeZone, day: 'numeric', month: 'long', year: 'numeric' }).format(at)
  const time = new Intl.DateTimeFormat(language, { timeZone, hour: '2-digit', minute: '2-digit' }).format(at)
  return `${day}, ${time}`
}

/** How far a zone is ahead of UTC at a moment, in milliseconds. */
function offsetOf(at: Date, timeZone: string): number {
  const parts = new Intl.DateTimeFormat('en-US', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: 'numeric',
    day: 'numeric',
    hour: 'numeric',
    minute: 'numeric',
    second: 'numeric',
  }).formatToParts(at)
  const of = (type: string) => Number(parts.find((part) => part.type === type)?.value)
  const local = Date.UTC(of('year'), of('month') - 1, of('day'), of('hour'), of('minute'), of('second'))
  return local - Math.floor(at.getTime() / 1000) * 1000
}

/**
 * The moment at which a wall clock of the zone shows `2026-04-03T06:00`.
 * A time that a spring change skips is moved on by the change; of one that autumn repeats, the first is taken.
 */
export function momentOf(wallClock: string, timeZone: string): Date {
  const asUtc = new Date(`${wallClock}:00Z`).getTime()
  const guesses = [-1, 1].map((side) => asUtc - offsetOf(new Date(asUtc + side * 86_400_000), timeZone))
  const fits = guesses.filter((guess) => guess + offsetOf(new Date(guess), timeZone) === asUtc)
  return new Date(fits.length > 0 ? Math.min(...fits) : Math.max(...guesses))
}
