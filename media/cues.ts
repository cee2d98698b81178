/** One caption, position in whole milliseconds from the start of the film. */
export type Cue = {
  startMs: number
  endMs: number
  /** WebVTT cue text, rewritten by us: only b i u v c lang ruby rt, properly closed and escaped. Lines are joined by `\n`. */
  text: string
  /** The same words without any markup. */
  plain: string
  speaker: string | null
  /** WebVTT cue settings as they stand behind the times, or ''. */
  settings: string
}

/** Something in a file, said to whoever wrote it. Lines count from 1. */
export type LineFinding = { line: number; message: string }

export type ReadCaptions = {
  cues: Cue[]
  /** What makes the file unfit: words or times would be lost or false. */
  errors: LineFinding[]
  /** What was put right or left out without loss. */
  notes: LineFinding[]
}

const two = (value: number) => String(value).padStart(2, '0')

/** `HH:MM:SS.mmm`, as WebVTT writes it. */
export function timestamp(ms: number): string {
  const seconds = Math.floor(ms / 1000)
  const rest = String(ms % 1000).padStart(3, '0')
  return `${two(Math.floor(seconds / 3600))}:${two(Math.floor(seconds / 60) % 60)}:${two(seconds % 60)}.${rest}`
}

/** Text as cue text: `-->` cannot end a cue and `<` cannot open a tag. */
export const escapeCueText = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;')
