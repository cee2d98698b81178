/** A stretch of a cue's text that the handbook knows, as character offsets into that text. */
export type TermSpan = { from: number; to: number; slug: string }

/** What is said between two seconds of an episode. */
export type CueText = { start: number; end: number; text: string; speaker: string | null; terms: TermSpan[] }

/** A spoken sentence; `terms` are offsets into its own text. Seconds. */
export type Sentence = { start: number; end: number; text: string; terms: TermSpan[] }

export type Paragraph = { start: number; end: number; speaker: string | null; sentences: Sentence[] }

/** The paragraphs under one chapter; `chapter` is its place in the list, or null for words before the first. */
export type Passage = { chapter: number | null; paragraphs: Paragraph[] }

type Stretch = { start: number; end: number }
/** Cues that run on into one another: the same speaker, the same chapter, no long pause. */
type Run = { chapter: number | null; speaker: string | null; cues: CueText[] }

/** A silence that ends a paragraph. Common practice, no source: about what a breath and a new thought take. */
export const longPauseSeconds = 2
/** Where a paragraph has grown past this many characters, the next sentence opens a new one. From memory: 60–70 words. */
const fullParagraph = 380

/** After these a full stop does not end the sentence. "in." and "No." are left out: they end real ones ("keep the bad ones in."). */
const shortened = /(?:^|[\s(])(?:Dr|Mr|Mrs|Ms|St|Fig|vs|approx|e\.g|i\.e)\.$/
const sentenceEnd = /[.?!…]["'”’)\]]*(?=\s|$)/g

/**
 * Sets cues as running text: sentences are joined over cue borders; paragraphs break at chapters, at long pauses,
 * at a change of speaker, and at a sentence's end once they are full. A sentence's seconds are those of its cues,
 * shared out by length where several sentences stand in one cue.
 */
export function paragraphsOf(cues: readonly CueText[], chapters: readonly Stretch[]): Passage[] {
  const passages: Passage[] = []
  for (const run of runsOf(cues, chapters)) {
    const paragraphs = splitFull(run.speaker, sentencesOf(run.cues))
    const open = passages.at(-1)
    if (open && open.chapter === run.chapter) open.paragraphs.push(...paragraphs)
    else if (paragraphs.length > 0) passages.push({ chapter: run.chapter, paragraphs })
  }
  return passages
}

/** All sentences in the order they are spoken. */
export function sentencesIn(passages: readonly Passage[]): Sentence[] {
  return passages.flatMap((passage) => passage.paragraphs.flatMap((paragraph) => paragraph.sentences))
}

/**
 * The place of the sentence being spoken at a second, or -1. A sentence stays through the short silence after it,
 * so that the rule under the text does not flicker between breaths.
 */
export function sentenceAt(sentences: readonly Sentence[], second: number): number {
  const last = lastStartedAt(sentences, second)
  const spoken = sentences[last]
  return spoken && second < spoken.end + longPauseSeconds ? last : -1
}

/** The place of the chapter a second lies in, or null before the first and in a gap. */
export function chapterAt(chapters: readonly Stretch[], second: number): number | null {
  const last = lastStartedAt(chapters, second)
  const chapter = chapters[last]
  return chapter && second < chapter.end ? last : null
}

/** The place of the last stretch that starts at or before a second, or -1. The stretches must be in order. */
function lastStartedAt(stretches: readonly Stretch[], second: number): number {
  let low = 0
  let high = stretches.length
  while (low < high) {
    const middle = (low + high) >> 1
    const stretch = stretches[middle]
    if (stretch && stretch.start <= second) low = middle + 1
    else high = middle
  }
  return low - 1
}

function runsOf(cues: readonly CueText[], chapters: readonly Stretch[]): Run[] {
  const runs: Run[] = []
  for (const cue of cues) {
    if (cue.text.trim() === '') continue
    // The middle of a cue says whose it is: caption makers seldom cut to the frame a chapter starts at.
    const chapter = chapterAt(chapters, (cue.start + cue.end) / 2)
    const open = runs.at(-1)
    const before = open?.cues.at(-1)
    const runsOn =
      open && before && open.chapter === chapter && open.speaker === cue.speaker && !isLongPause(before, cue)
    if (runsOn) open.cues.push(cue)
    else runs.push({ chapter, speaker: cue.speaker, cues: [cue] })
  }
  return runs
}

/** A pause inside a sentence is the speaker looking at the crop, not a new paragraph; it must be twice as long. */
function isLongPause(before: CueText, after: CueText): boolean {
  const silence = after.start - before.end
  const finished = /[.?!…]["'”’)\]]*\s*$/.test(before.text)
  return silence >= (finished ? longPauseSeconds : 2 * longPauseSeconds)
}

/** Where each cue begins in the joined text, so that offsets and seconds can be carried over. */
type Placed = { cue: CueText; from: number; to: number }

function sentencesOf(cues: readonly CueText[]): Sentence[] {
  const placed: Placed[] = []
  let text = ''
  for (const cue of cues) {
    if (text !== '') text += ' '
    placed.push({ cue, from: text.length, to: text.length + cue.text.length })
    // One character for one: a line break inside a cue becomes a space and no offset moves.
    text += cue.text.replace(/\s/g, ' ')
  }
  return cutsOf(text)
    .map(([from, to]) => sentenceOf(text, from, to, placed))
    .filter((sentence) => sentence.text !== '')
}

/** The [from, to) ranges of the sentences in a text. */
function cutsOf(text: string): [number, number][] {
  const cuts: [number, number][] = []
  let from = 0
  for (const match of text.matchAll(sentenceEnd)) {
    const to = match.index + match[0].length
    const next = text.slice(to).trimStart().charAt(0)
    const goesOn = next !== '' && next === next.toLowerCase() && next !== next.toUpperCase()
    if (goesOn || (next !== '' && shortened.test(text.slice(from, to)))) continue
    cuts.push([from, to])
    from = to
  }
  if (from < text.length) cuts.push([from, text.length])
  return cuts
}

function sentenceOf(text: string, from: number, to: number, placed: readonly Placed[]): Sentence {
  const raw = text.slice(from, to)
  const begin = from + (raw.length - raw.trimStart().length)
  const body = raw.trim()
  const end = begin + body.length
  const terms = placed.flatMap(({ cue, from: at }) =>
    cue.terms
      .map((term) => ({ slug: term.slug, from: at + term.from - begin, to: at + term.to - begin }))
      .filter((term) => term.from >= 0 && term.to <= end - begin && term.from < term.to),
  )
  return { start: secondAt(placed, begin), end: secondAt(placed, end), text: body, terms }
}

/** The second at which a character is spoken, sharing a cue's time evenly over its characters. */
function secondAt(placed: readonly Placed[], offset: number): number {
  const within = placed.find(({ to }) => offset <= to) ?? placed.at(-1)
  if (!within) return 0
  const share = Math.max(0, offset - within.from) / Math.max(1, within.to - within.from)
  const second = within.cue.start + Math.min(1, share) * (within.cue.end - within.cue.start)
  return Math.round(second * 1000) / 1000
}

function splitFull(speaker: string | null, sentences: readonly Sentence[]): Paragraph[] {
  const paragraphs: Paragraph[] = []
  let length = Infinity
  for (const sentence of sentences) {
    if (length >= fullParagraph) {
      paragraphs.push({ start: sentence.start, end: sentence.end, speaker, sentences: [] })
      length = 0
    }
    const open = paragraphs.at(-1)
    if (!open) continue
    open.sentences.push(sentence)
    open.end = sentence.end
    length += sentence.text.length
  }
  return paragraphs
}
