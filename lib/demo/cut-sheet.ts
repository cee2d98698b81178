import { linesOf } from './story/story'
import type { Speaker, StoryEpisode } from './story/types'

/** Where everything of a film lies, milliseconds from its start. */
export type CutSheet = {
  durationMs: number
  chapters: { startMs: number; endMs: number }[]
  cues: { startMs: number; endMs: number; chapter: number; text: string; speaker: Speaker; key: string | null }[]
}

const leadMs = 900
const restMs = 420
const tailMs = 1300

/** Lays sentences of the given lengths one after another: a breath after each, a longer one where the scene changes. */
export function cutSheet(episode: StoryEpisode, owner: Speaker, spokenMs: number[]): CutSheet {
  const chapters: CutSheet['chapters'] = []
  const cues: CutSheet['cues'] = []
  let at = 0
  for (const [index, { line, chapter }] of linesOf(episode).entries()) {
    if (chapter === chapters.length) {
      chapters.push({ startMs: at, endMs: at })
      at += leadMs
    }
    const endMs = at + (spokenMs[index] ?? 0)
    cues.push({ startMs: at, endMs, chapter, text: line.text, speaker: line.by ?? owner, key: line.key ?? null })
    at = endMs + (line.rest ?? restMs)
  }
  const durationMs = at + tailMs
  for (const [index, chapter] of chapters.entries()) chapter.endMs = chapters[index + 1]?.startMs ?? durationMs
  return { durationMs, chapters, cues }
}

/** The moment at which a sentence begins and ends. Throws where the story names a sentence that nobody says. */
export function momentOf(sheet: CutSheet, key: string): { startMs: number; endMs: number } {
  const cue = sheet.cues.find((one) => one.key === key)
  if (!cue) throw new Error(`no sentence is called ${key}`)
  return cue
}
