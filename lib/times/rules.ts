type Clock = { hours: number; minutes: number; seconds: number }

/** Whole seconds, cut and not rounded: a link to 3:12 must open on what is said at 3:12, never after it. */
function clockOf(position: number): Clock {
  const whole = Math.max(0, Math.floor(Number.isFinite(position) ? position : 0))
  return { hours: Math.floor(whole / 3600), minutes: Math.floor(whole / 60) % 60, seconds: whole % 60 }
}

const twoDigits = (value: number) => String(value).padStart(2, '0')

/** A position in seconds as it stands on screen: `3:12`, from an hour on `1:03:12`. */
export function timeCode(position: number): string {
  const { hours, minutes, seconds } = clockOf(position)
  if (hours > 0) return `${hours}:${twoDigits(minutes)}:${twoDigits(seconds)}`
  return `${minutes}:${twoDigits(seconds)}`
}

const counted = (value: number, word: string) => `${value} ${word}${value === 1 ? '' : 's'}`

/** The same position for a screen reader: `3 minutes 12 seconds`. */
export function spokenTime(position: number): string {
  const { hours, minutes, seconds } = clockOf(position)
  const parts = [
    hours && counted(hours, 'hour'),
    minutes && counted(minutes, 'minute'),
    seconds && counted(seconds, 'second'),
  ]
  return parts.filter(Boolean).join(' ') || '0 seconds'
}

/** The same position as an ISO 8601 duration, for `<time>` and structured data: `PT3M12S`. */
export function isoDuration(position: number): string {
  const { hours, minutes, seconds } = clockOf(position)
  return `PT${hours ? `${hours}H` : ''}${minutes ? `${minutes}M` : ''}${seconds || (!hours && !minutes) ? `${seconds}S` : ''}`
}

/** How long something lasts, as a list says it: `48 s`, from a minute and a half on `12 min`, from an hour `1 h 5 min`. */
export function lengthWords(length: number): string {
  // Cut like the clock of the player: 50.8 s is 0:50 there.
  if (length < 90) return `${Math.floor(length)} s`
  const minutes = Math.round(length / 60)
  if (minutes < 60) return `${minutes} min`
  return `${Math.floor(minutes / 60)} h${minutes % 60 ? ` ${minutes % 60} min` : ''}`
}
