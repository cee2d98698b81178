/** Edges of something drawn, in CSS px from one common origin. */
type Span = { top: number; bottom: number }

/** The band, as shares of the view's height, in which the spoken sentence may stand without the text being moved. */
const band = { from: 0.08, to: 0.75 }
/** Where it is put when it has left the band: high enough to read on, low enough to see what came before. */
const rest = 0.25

/** How far the text must be scrolled to show the spoken sentence, in CSS px; 0 while it stands well. */
export function scrollNeeded(sentence: Span, view: Span): number {
  const height = view.bottom - view.top
  if (height <= 0) return 0
  const top = view.top + height * band.from
  const bottom = view.top + height * band.to
  if (sentence.top >= top && sentence.bottom <= bottom) return 0
  return Math.round(sentence.top - (view.top + height * rest))
}

const scrollKeys = new Set(['PageUp', 'PageDown', 'Home', 'End', 'ArrowUp', 'ArrowDown', ' '])

type ReaderEvent = { type: string; key?: string; defaultPrevented: boolean }

/**
 * Whether something the reader did means "I am reading elsewhere now". Scrolling by the program raises none of these
 * events, so following never takes itself for the reader. A key that a control has used (the row, a field) is not one.
 */
export function isReading({ type, key, defaultPrevented }: ReaderEvent): boolean {
  if (defaultPrevented) return false
  return type === 'keydown' ? scrollKeys.has(key ?? '') : true
}
