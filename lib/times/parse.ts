/**
 * A position as people write it: `75`, `1:15`, `1:15.5`, `1:02:03`. Seconds with millisecond precision, or null.
 */
export function parseTime(written: string): number | null {
  const parts = written.trim().replace(',', '.').split(':')
  if (
    parts.length > 3 ||
    !parts.every((part, n) => (n === parts.length - 1 ? /^\d{1,5}(\.\d{1,3})?$/ : /^\d{1,5}$/).test(part))
  )
    return null
  const numbers = parts.map(Number)
  if (numbers.slice(1).some((value) => value >= 60)) return null
  return Math.round(numbers.reduce((total, value) => total * 60 + value, 0) * 1000) / 1000
}

/** The same with tenths, as the desk shows it: `7:31.4`. */
export function writeTime(position: number): string {
  const tenths = Math.round(position * 10)
  const seconds = (tenths % 600) / 10
  const minutes = Math.floor(tenths / 600)
  const tail = seconds.toFixed(1).padStart(4, '0')
  return minutes < 60
    ? `${minutes}:${tail}`
    : `${Math.floor(minutes / 60)}:${String(minutes % 60).padStart(2, '0')}:${tail}`
}
