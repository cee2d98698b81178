import type { PictureChoice } from './film-source'

/** One encoded size; a height of 0 is the sound alone. Bytes for the whole episode. */
export type FilmSize = { height: number; bitrate: number; bytes: number }

/** `74 MB`: what a line and a data plan are counted in (SI, 10⁶ bytes). */
export function dataWords(bytes: number): string {
  const mega = bytes / 1e6
  if (mega < 1) return 'under 1 MB'
  return mega < 1000 ? `${Math.round(mega)} MB` : `${(mega / 1000).toFixed(1)} GB`
}

const uses = (size: FilmSize | undefined) => {
  if (!size || size.bytes <= 0) return ''
  const data = dataWords(size.bytes)
  return data.startsWith('under') ? `, uses ${data}` : `, uses about ${data}`
}

/** The choices, biggest picture first, each with the data it uses. */
export function pictureOptions(sizes: readonly FilmSize[]): { value: string; label: string }[] {
  const pictures = sizes.filter((size) => size.height > 0).sort((a, b) => b.height - a.height)
  const sound = sizes.find((size) => size.height === 0)
  return [
    { value: 'auto', label: 'As the line allows' },
    ...pictures.map((size) => ({ value: String(size.height), label: `${size.height}${uses(size)}` })),
    { value: 'sound', label: `Sound only${uses(sound)}` },
  ]
}

export const asChoice = (value: string): PictureChoice =>
  value === 'auto' || value === 'sound' ? value : Number(value)

/**
 * What the control says: "Picture: 480, uses about 74 MB". `shown` is the height on screen now, which tells what
 * "as the line allows" comes to; null before the first picture.
 */
export function pictureWords(choice: PictureChoice, shown: number | null, sizes: readonly FilmSize[]) {
  if (choice === 'sound') {
    const size = sizes.find(({ height }) => height === 0)
    return { full: `Sound only${uses(size)}`, short: 'Sound only' }
  }
  const height = choice === 'auto' ? shown : choice
  if (height === null) return { full: 'Picture: as the line allows', short: 'Picture' }
  const size = sizes.find((one) => one.height === height)
  return {
    full: `Picture: ${height}${uses(size)}`,
    // Never less than 1 MB here: the short form has no room for "under".
    short: size && size.bytes > 0 ? `${height}, ${dataWords(Math.max(1e6, size.bytes))}` : `Picture ${height}`,
  }
}
