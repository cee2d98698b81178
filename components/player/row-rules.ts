import { chapterAt } from '@/lib/captions/rules'
import { spokenTime, timeCode } from '@/lib/times/rules'
import type { StageKey } from '@/lib/topics/stage-words'

/** Seconds throughout. */
export type RowChapter = { start: number; end: number; title: string; stage: StageKey | null }
export type RowReading = { at: number; quantity: string; value: number; unit: string; note: string | null }
export type RowCorrection = { id: string; at: number; said: string; right: string; on: string }
export type RowQuestion = {
  id: string
  title: string
  state: string
  asking: number
  /** Null when it was asked about the episode as a whole: then it has no pin. */
  at: number | null
  url: string
  followUp: { number: number; url: string; start: number } | null
}

/** A mark on the row. `name` is what a screen reader says and what the pin stands for. */
export type Pin = {
  key: string
  at: number
  kind: 'reading' | 'answered' | 'waiting' | 'correction'
  name: string
  /** Where an answered question came back. */
  turn: { url: string; words: string } | null
}

type PinSources = { readings: RowReading[]; questions: RowQuestion[]; corrections: RowCorrection[] }

const inFigures = new Intl.NumberFormat('en-US', { maximumFractionDigits: 6 })

/**
 * A reading as a figure to be set large and the words beside it: `31 °F` and `soil at crown depth`, `19` and `plants per
 * square foot`. A short sign stands with its figure, on one line (NIST SP 811, 7.2 asks for the space).
 */
export function readingParts({ value, unit, quantity }: RowReading): { figure: string; words: string } {
  const figure = inFigures.format(value)
  if (unit.length <= 3) return { figure: `${figure}\u00a0${unit}`, words: quantity }
  return { figure, words: unit.startsWith('per ') ? `${quantity} ${unit}` : `${unit}, ${quantity}` }
}

function readingWords(reading: RowReading): string {
  const { figure, words } = readingParts(reading)
  return `${figure} ${words}`
}

/** `episode 11, 2:05`, the place an answer is given. */
export const followUpPlace = ({ number, start }: { number: number; start: number }) =>
  `episode ${number}, ${timeCode(start)}`

/** All pins in the order of the film. */
export function pinsOf({ readings, questions, corrections }: PinSources): Pin[] {
  return [
    ...readings.map((reading, at) => readingPin(reading, at)),
    ...questions.flatMap((question) => (question.at === null ? [] : [questionPin(question, question.at)])),
    ...corrections.map(correctionPin),
  ].sort((a, b) => a.at - b.at)
}

const readingPin = (reading: RowReading, at: number): Pin => ({
  key: `reading-${at}`,
  at: reading.at,
  kind: 'reading',
  name: `Reading at ${timeCode(reading.at)}: ${readingWords(reading)}`,
  turn: null,
})

function questionPin({ id, title, followUp }: RowQuestion, at: number): Pin {
  const place = followUp && followUpPlace(followUp)
  return {
    key: `question-${id}`,
    at,
    kind: followUp ? 'answered' : 'waiting',
    name: `Question at ${timeCode(at)}: ${title} ${place ? `Answered in ${place}` : 'Waiting for an answer'}`,
    turn: followUp && place ? { url: followUp.url, words: place } : null,
  }
}

const correctionPin = ({ id, at, right }: RowCorrection): Pin => ({
  key: `correction-${id}`,
  at,
  kind: 'correction',
  name: `Correction at ${timeCode(at)}: ${right}`,
  turn: null,
})

/** The least size of a target, in CSS px (WCAG 2.5.8). */
export const pinSize = 24

/**
 * The lane of each pin above the row, 0 nearest to it: a pin keeps its exact second and moves up, never aside, where it
 * would cover another. `width` is the row's in CSS px.
 */
export function lanesOf(pins: readonly { at: number }[], duration: number, width: number): number[] {
  const lastInLane: number[] = []
  return pins.map(({ at }) => {
    const x = (at / Math.max(duration, 1)) * width
    const free = lastInLane.findIndex((last) => x - last >= pinSize)
    const lane = free === -1 ? lastInLane.length : free
    lastInLane[lane] = x
    return lane
  })
}

/**
 * A place as it is announced: it changes once a second, and stays in the chapter of the exact place. A chapter that
 * starts at 13.05 is not the one before because its second is 13.
 */
export function announcedPlace(at: number, chapters: readonly RowChapter[]): number {
  return Math.max(Math.floor(at), chapters[chapterAt(chapters, at) ?? -1]?.start ?? 0)
}

/** What the seek control says: "3 minutes 12 seconds of 12 minutes 4 seconds, Throwing the hoop". */
export function placeWords(at: number, duration: number, chapters: readonly RowChapter[]): string {
  const chapter = chapters[chapterAt(chapters, at) ?? -1]
  const place = `${spokenTime(at)} of ${spokenTime(duration)}`
  return chapter ? `${place}, ${chapter.title}` : place
}

/** The pin whose turn is drawn unasked: the answered question of this chapter last passed, else its first. */
export function turningPin(pins: readonly Pin[], chapter: { start: number; end: number } | undefined, at: number) {
  const here = pins.filter((pin) => pin.turn && chapter && pin.at >= chapter.start && pin.at < chapter.end)
  return here.findLast((pin) => pin.at <= at) ?? here[0] ?? null
}

/** A second on the row as a share of its width, `26.5%`. */
export const rowShare = (at: number, duration: number) =>
  `${Math.round((Math.min(at, duration) / Math.max(duration, 1)) * 10_000) / 100}%`
