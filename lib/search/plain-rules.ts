import type { SearchDocument } from './document-rules'
import { cutAround, markWords } from './mark-rules'
import { foldedWords, type Narrowing } from './rules'
import type { FoundDocument } from './views'

/** Whether each sought word begins some word of the document. */
export function answersAll({ title, spoken, text, words }: SearchDocument, sought: readonly string[]): boolean {
  const present = foldedWords([title, ...spoken, text, words].join(' '))
  return sought.every((each) => present.some((word) => word.startsWith(each)))
}

/** Whether a document passes the choices made; the same meaning that `conditionsOf` gives the index. */
export function fitsNarrowing(document: SearchDocument, narrowing: Narrowing): boolean {
  const { kind, channel, crop, stage, job, subject, season } = narrowing
  const fits = (wanted: string | undefined, has: readonly (string | null)[]) =>
    wanted === undefined || has.includes(wanted)
  return (
    fits(kind, [document.kind]) &&
    fits(channel, [document.channel]) &&
    fits(season, [document.season]) &&
    fits(crop, document.crops) &&
    fits(stage, [...document.stages, ...document.stageKeys]) &&
    fits(job, document.jobs) &&
    fits(subject, document.subjects)
  )
}

/** The document with its found words marked, and a longer text cut around them. */
export const markedDocument = (document: SearchDocument, sought: readonly string[]): FoundDocument => ({
  ...document,
  spoken: document.spoken.map((sentence) => markWords(sentence, sought)),
  text: cutAround(markWords(document.text, sought)),
})
