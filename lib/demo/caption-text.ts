import { escapeCueText, timestamp } from '@/media/cues'
import type { CutSheet } from './cut-sheet'
import { people } from './story/people'

const width = 37

/** Two lines of about the same length where one would be too long. */
export function twoLines(text: string): string {
  if (text.length <= width) return text
  const gaps = [...text.matchAll(/ /g)].map((gap) => gap.index)
  const middle = text.length / 2
  const nearest = gaps.reduce((best, gap) => (Math.abs(gap - middle) < Math.abs(best - middle) ? gap : best), 0)
  return `${text.slice(0, nearest)}\n${text.slice(nearest + 1)}`
}

const firstName = (key: string) =>
  people
    .find((person) => person.key === key)
    ?.name.replace(/^Dr /, '')
    .split(' ')[0]

/** What is said, as a WebVTT file; names stand where more than one person speaks. */
export function captionText(sheet: CutSheet): string {
  const several = new Set(sheet.cues.map((cue) => cue.speaker)).size > 1
  const cues = sheet.cues.map(({ startMs, endMs, text, speaker }) => {
    const said = escapeCueText(twoLines(text))
    return `${timestamp(startMs)} --> ${timestamp(endMs)}\n${several ? `<v ${firstName(speaker)}>${said}</v>` : said}`
  })
  return ['WEBVTT', ...cues].join('\n\n') + '\n'
}
