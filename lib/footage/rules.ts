/** States of footage, in the order in which it passes through them; `failed` can follow any but the last. */
export type FootageState = 'receiving' | 'inspecting' | 'encoding' | 'ready' | 'failed'

/** A chunk takes well under the five minutes after which Node cuts a request, also on half a megabit. */
export const chunkBytes = 8 * 2 ** 20

/** How long an unfinished upload is kept: a week of bad line, or the weekend away from the yard. */
export const keptDays = 7

/** After this many starts the work is given up and said so; a fresh try is the owner's to ask for. */
export const mostAttempts = 6

const steps: Record<string, string> = {
  inspecting: 'Looking the film over',
  'first-size': 'Making the smallest size, with sound',
  stills: 'Taking the still',
  'more-sizes': 'Making the larger sizes',
  finishing: 'Checking what was made',
}

/** What is being done, in words for the owner. */
export const stepWords = (step: string | null): string => (step && steps[step]) || 'Waiting for its turn'

/** A film that is being worked on, so that asking again makes sense. */
export const isUnderWay = (state: FootageState): boolean => state === 'inspecting' || state === 'encoding'

/** Upload names are data alone: no control characters, no turned-round letters, not longer than a file system allows. */
export function cleanFilename(name: string): string {
  const plain = name
    .normalize('NFC')
    .replace(/[\p{Cc}\p{Cf}\p{Zl}\p{Zp}\p{Cs}]/gu, '')
    .trim()
  return [...plain].slice(0, 200).join('') || 'film'
}

const kinds = /^(video\/[\w.+-]{1,60}|application\/(mp4|x-matroska|octet-stream))$/i

/** The browser's word for what the file is; kept as a note, believed by nobody. */
export const cleanFiletype = (type: string | undefined): string | null =>
  type && kinds.test(type) ? type.toLowerCase() : null

/** Seconds until the rest has come, at the pace of the last while; null while there is no pace yet. */
export function secondsLeft(sentBytes: number, totalBytes: number, bytesPerSecond: number): number | null {
  return bytesPerSecond > 0 ? Math.ceil((totalBytes - sentBytes) / bytesPerSecond) : null
}

/** Pace over the last seconds of sending, from `[ms, bytes]` samples, oldest first. Null with less than a second of them. */
export function paceOf(samples: readonly (readonly [number, number])[]): number | null {
  const first = samples[0]
  const last = samples.at(-1)
  if (!first || !last || last[0] - first[0] < 1000) return null
  return ((last[1] - first[1]) * 1000) / (last[0] - first[0])
}

/** "820 MB", "3.4 GB": decimal units, as phones and cameras count. */
export function sizeWords(bytes: number): string {
  if (bytes >= 1e9) return `${(bytes / 1e9).toFixed(1)} GB`
  if (bytes >= 1e6) return `${Math.round(bytes / 1e6)} MB`
  return `${Math.max(1, Math.round(bytes / 1e3))} kB`
}

/** "about 4 minutes", for things that cannot be known to the second. */
export function aboutWords(seconds: number): string {
  if (seconds < 45) return 'less than a minute'
  const minutes = Math.round(seconds / 60)
  if (minutes < 90) return `about ${Math.max(1, minutes)} minute${minutes > 1 ? 's' : ''}`
  const hours = Math.round(minutes / 30) / 2
  return `about ${hours} hours`
}
