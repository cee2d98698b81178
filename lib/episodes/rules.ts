export type EpisodeState = 'draft' | 'scheduled' | 'published' | 'withdrawn'

/** A title as part of an address: letters and digits of any script that has a plain form, words joined by hyphens. */
export function slugOf(title: string): string {
  const plain = title
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60)
    .replace(/-+$/, '')
  return plain || 'episode'
}

/** The first free one of slug, slug-2, slug-3 … */
export function freeSlug(wanted: string, taken: ReadonlySet<string>): string {
  for (let n = 1; ; n++) {
    const slug = n === 1 ? wanted : `${wanted}-${n}`
    if (!taken.has(slug)) return slug
  }
}

/** An episode as it stands, as far as the walk-round looks at it. */
export type WalkRoundFacts = {
  footage: 'none' | 'receiving' | 'inspecting' | 'encoding' | 'ready' | 'failed'
  hasSound: boolean
  durationMs: number | null
  language: string
  chapters: { startMs: number; title: string; topics: number }[]
  captions: { language: string; cues: number; checked: boolean }[]
  hazards: string[]
  cautionsConfirmed: boolean
  bookedWithoutAnswer: number
}

export type WalkRoundLine = { rule: string; ok: boolean; detail: string }

const footageLine = ({ footage }: WalkRoundFacts): WalkRoundLine => {
  const detail = {
    none: 'No footage yet. Upload the film first.',
    receiving: 'The film is still being uploaded.',
    inspecting: 'The film is being looked at.',
    encoding: 'The sizes are still being made.',
    ready: 'The film is ready in every size.',
    failed: 'The film could not be used. Replace it or try again.',
  }[footage]
  return { rule: 'footage', ok: footage === 'ready', detail }
}

function chaptersLine({ chapters, durationMs }: WalkRoundFacts): WalkRoundLine {
  const late = chapters.filter(({ startMs }) => durationMs !== null && startMs >= durationMs)
  if (chapters.length === 0) return { rule: 'chapters', ok: false, detail: 'No chapters yet. Set at least one.' }
  if (late.length > 0)
    return { rule: 'chapters', ok: false, detail: `“${late[0]?.title}” starts after the film has ended.` }
  return { rule: 'chapters', ok: true, detail: `${chapters.length} set.` }
}

function topicsLine({ chapters }: WalkRoundFacts): WalkRoundLine {
  const without = chapters.filter(({ topics }) => topics === 0)
  if (chapters.length === 0) return { rule: 'topics', ok: false, detail: 'Nothing to file yet.' }
  if (without.length === 0) return { rule: 'topics', ok: true, detail: 'Every chapter is filed.' }
  return { rule: 'topics', ok: false, detail: `“${without[0]?.title}” is not filed under any stage, job or subject.` }
}

/** WCAG 2.2, 1.2.2: captions for every published film with sound. */
function captionsLine(facts: WalkRoundFacts): WalkRoundLine {
  if (facts.footage === 'ready' && !facts.hasSound)
    return { rule: 'captions', ok: true, detail: 'The film has no sound, so it needs no captions.' }
  const own = facts.captions.find(({ language }) => language === facts.language) ?? facts.captions[0]
  if (!own || own.cues === 0)
    return { rule: 'captions', ok: false, detail: 'No captions yet. Bring a WebVTT or SRT file.' }
  if (!own.checked)
    return { rule: 'captions', ok: false, detail: 'The captions are a draft that nobody has been through.' }
  return { rule: 'captions', ok: true, detail: `${own.cues} lines.` }
}

function cautionsLine({ hazards, cautionsConfirmed }: WalkRoundFacts): WalkRoundLine {
  if (hazards.length === 0) return { rule: 'cautions', ok: true, detail: 'No chapter is filed under a hazardous job.' }
  return cautionsConfirmed
    ? { rule: 'cautions', ok: true, detail: `Confirmed for ${hazards.join(', ')}.` }
    : { rule: 'cautions', ok: false, detail: `Read and confirm the cautions for ${hazards.join(', ')}.` }
}

function questionsLine({ bookedWithoutAnswer: open }: WalkRoundFacts): WalkRoundLine {
  const detail =
    open === 0
      ? 'No booked question is without its answer.'
      : `${open} booked without an answer yet; published so, it goes back to the queue.`
  return { rule: 'questions', ok: true, detail }
}

/** What stands between an episode and publication, in the order of the work. The publish call enforces the same lines. */
export const walkRound = (facts: WalkRoundFacts): WalkRoundLine[] =>
  [footageLine, chaptersLine, topicsLine, captionsLine, cautionsLine, questionsLine].map((look) => look(facts))

export const failingLines = (facts: WalkRoundFacts): WalkRoundLine[] => walkRound(facts).filter(({ ok }) => !ok)
