import type { Finding } from './views'

type Measured = { start: number; end: number; text: string }

/** Levels after FCC 47 CFR 79.1(j)(2) and the DCMP Captioning Key: past `error` a reader cannot keep up. */
const LIMITS = {
  lines: { warn: 2, error: 3 },
  characters: { warn: 37, error: 42 },
  shortest: { warn: 1.33, error: 0.8 },
  longest: { warn: 6, error: 8 },
  wordsPerMinute: { warn: 160, error: 235 },
  charactersPerSecond: { warn: 17, error: 25 },
}

type Level = { warn: number; error: number }

const over = (value: number, level: Level, message: string): Finding[] =>
  value > level.error ? [{ level: 'error', message }] : value > level.warn ? [{ level: 'warning', message }] : []

const under = (value: number, level: Level, message: string): Finding[] =>
  value < level.error ? [{ level: 'error', message }] : value < level.warn ? [{ level: 'warning', message }] : []

/** What makes one cue hard to read. `start` and `end` in seconds, `text` without markup. */
export function findingsOf({ start, end, text }: Measured): Finding[] {
  const lasts = end - start
  const lines = text.split('\n')
  const words = text.split(/\s+/).filter(Boolean).length
  const widest = Math.max(...lines.map((line) => [...line].length))
  const speed = (words / lasts) * 60
  const density = [...text].length / lasts
  return [
    ...over(lines.length, LIMITS.lines, `${lines.length} lines; two read best.`),
    ...over(widest, LIMITS.characters, `A line of ${widest} characters; keep to 37.`),
    ...under(lasts, LIMITS.shortest, `Only ${lasts.toFixed(2)} s on screen.`),
    ...over(lasts, LIMITS.longest, `${lasts.toFixed(1)} s on screen; split it.`),
    ...over(speed, LIMITS.wordsPerMinute, `${Math.round(speed)} words a minute.`),
    ...over(density, LIMITS.charactersPerSecond, `${Math.round(density)} characters a second.`),
  ]
}

/** Cues that stand on screen at the same time as the one before. */
export function overlapsOf(cues: readonly Measured[]): Map<number, Finding> {
  const found = new Map<number, Finding>()
  for (const [n, cue] of cues.entries()) {
    const before = cues[n - 1]
    if (before && cue.start < before.end)
      found.set(n, { level: 'error', message: 'Begins before the last one has ended.' })
  }
  return found
}
