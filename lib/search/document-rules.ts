import { type CueText, paragraphsOf, sentencesIn } from '@/lib/captions/rules'
import { topicByCode } from '@/lib/topics/rules'
import { type Filing, filing, plainText } from './rules'
import type { SearchKind } from './schema'

/**
 * One thing that can be found. `source` names what it was made from, so that a change of that takes along all its
 * documents. A passage is spoken: a sentence per entry of `spoken`, its second in `starts`.
 */
export type SearchDocument = Filing & {
  id: string
  kind: SearchKind
  source: string
  title: string
  spoken: string[]
  starts: number[]
  text: string
  /** Other names it may be looked for by. */
  words: string
  channel: string | null
  season: string | null
  /** Day of publication since 1970, the last thing that decides between equals. */
  day: number
  end: number | null
}

export type EpisodeFacts = {
  id: string
  title: string
  summary: string | null
  number: number
  channel: { slug: string; name: string }
  season: string | null
  publishedAt: Date | null
  chapters: { id: string; title: string; start: number; end: number; codes: string[] }[]
  cues: CueText[]
}

const DAY_MS = 86_400_000
const dayOf = (date: Date | null) => Math.floor((date?.getTime() ?? 0) / DAY_MS)

const labels = (codes: readonly string[]) => codes.flatMap((code) => topicByCode(code)?.label ?? []).join(' · ')

const blank = { spoken: [], starts: [], text: '', words: '', channel: null, season: null, day: 0, end: null }

/** Speech without full stops is one long sentence: it is cut, so that a result still opens near its words. */
const LONGEST_SENTENCE = 60
const CUT_TO = 30

type Spoken = { start: number; end: number; text: string }

function cut({ start, end, text }: Spoken): Spoken[] {
  const words = text.split(/\s+/)
  if (words.length <= LONGEST_SENTENCE) return [{ start, end, text }]
  const each = (end - start) / words.length
  return Array.from({ length: Math.ceil(words.length / CUT_TO) }, (_, n) => ({
    start: start + n * CUT_TO * each,
    end: Math.min(end, start + (n + 1) * CUT_TO * each),
    text: words.slice(n * CUT_TO, (n + 1) * CUT_TO).join(' '),
  }))
}

/** What is spoken in each chapter; before the first one under `null`. */
function spokenBy(chapters: EpisodeFacts['chapters'], cues: CueText[]): Map<number | null, Spoken[]> {
  const found = new Map<number | null, Spoken[]>()
  for (const passage of paragraphsOf(cues, chapters)) {
    const sentences = sentencesIn([passage]).flatMap(cut)
    found.set(passage.chapter, [...(found.get(passage.chapter) ?? []), ...sentences])
  }
  return found
}

function spokenFields(sentences: readonly Spoken[], from: number, to: number | null) {
  return {
    spoken: sentences.map(({ text }) => plainText(text)),
    // With nothing said, a passage opens where it begins.
    starts: sentences.length > 0 ? sentences.map(({ start }) => Math.round(start * 1000) / 1000) : [from],
    end: to,
  }
}

/** The passages of an episode and the episode itself. Words before the first chapter are a passage under its title. */
export function episodeDocuments(episode: EpisodeFacts): SearchDocument[] {
  const { id, channel, season } = episode
  const common = { ...blank, source: `episode-${id}`, channel: channel.slug, season, day: dayOf(episode.publishedAt) }
  const said = spokenBy(episode.chapters, episode.cues)
  const passages = episode.chapters.map(({ id: chapterId, title, start, end, codes }, n): SearchDocument => ({
    ...common,
    ...filing(codes),
    ...spokenFields(said.get(n) ?? [], start, end),
    id: `passage-${chapterId}`,
    kind: 'passage',
    title: plainText(title),
    words: labels(codes),
  }))
  const opening = said.get(null) ?? []
  const codes = episode.chapters.flatMap((chapter) => chapter.codes)
  const whole: SearchDocument = {
    ...common,
    ...filing(codes),
    id: `episode-${id}`,
    kind: 'episode',
    title: plainText(episode.title),
    text: plainText(episode.summary ?? ''),
    words: `${channel.name} · episode ${episode.number}`,
  }
  const before: SearchDocument = {
    ...common,
    ...filing([]),
    ...spokenFields(opening, 0, opening.at(-1)?.end ?? null),
    id: `passage-${id}`,
    kind: 'passage',
    title: plainText(episode.title),
  }
  return [...(opening.length > 0 ? [before] : []), ...passages, whole]
}

export type QuestionFacts = {
  id: string
  title: string
  body: string
  /** Only when the episode that answers is published. */
  answer: string | null
  channel: string
  season: string | null
  crop: string | null
  stage: string | null
  askedAt: Date
}

export function questionDocument(question: QuestionFacts): SearchDocument {
  const { id, crop, stage, channel, season } = question
  const filed = filing(stage ? [stage] : [])
  return {
    ...blank,
    ...filed,
    crops: crop ? [crop] : filed.crops,
    id: `question-${id}`,
    kind: 'question',
    source: `question-${id}`,
    title: plainText(question.title),
    text: plainText([question.body, question.answer ?? ''].join(' ')),
    words: stage ? labels([stage]) : '',
    channel,
    season,
    day: dayOf(question.askedAt),
  }
}

export type TermFacts = { id: string; label: string; definition: string; names: string[]; crops: string[] }

export const termDocument = ({ id, label, definition, names, crops }: TermFacts): SearchDocument => ({
  ...blank,
  ...filing([]),
  crops,
  id: `term-${id}`,
  kind: 'term',
  source: `term-${id}`,
  title: plainText(label),
  text: plainText(definition),
  words: plainText(names.join(' · ')),
})

export type ExplainerFacts = { id: string; title: string; summary: string; body: string }

/** Markdown as the words that are read: no marks of emphasis, no addresses, no backslashes. */
export function markdownWords(markdown: string): string {
  return markdown
    .replace(/!?\[((?:\\.|[^\]\\])*)\]\([^)]*\)/g, '$1')
    .replace(/^\s*(#{1,6}|[-*+>]|\d+\.)\s+/gm, '')
    .replace(/(?<!\\)[*_`|]+/g, '')
    .replace(/\\([^\p{L}\p{N}\s])/gu, '$1')
}

export const explainerDocument = ({ id, title, summary, body }: ExplainerFacts): SearchDocument => ({
  ...blank,
  ...filing([]),
  id: `explainer-${id}`,
  kind: 'explainer',
  source: `explainer-${id}`,
  title: plainText(title),
  text: plainText(`${summary} ${markdownWords(body)}`),
})
