import { phrasesOf } from './story/story'
import type { Speaker, StoryEpisode } from './story/types'

export type CutCue = {
  startMs: number
  endMs: number
  chapter: number
  /** Which sentence of the chapter. */
  line: number
  text: string
  speaker: Speaker
  key: string | null
}

/** Where everything of a film lies, milliseconds from its start. */
export type CutSheet = {
  durationMs: number
  chapters: { startMs: number; endMs: number }[]
  cues: CutCue[]
}

const leadMs = 900
const restMs = 420
const tailMs = 1300

/** Lays phrases of the given lengths one after another: a breath after each, a longer one where the scene changes. */
export function cutSheet(episode: StoryEpisode, owner: Speaker, spokenMs: number[]): CutSheet {
  const chapters: CutSheet['chapters'] = []
  const cues: CutSheet['cues'] = []
  let at = 0
  for (const [index, { text, by, chapter, line, key, rest }] of phrasesOf(episode).entries()) {
    if (chapter === chapters.length) {
      chapters.push({ startMs: at, endMs: at })
      at += leadMs
    }
    const endMs = at + (spokenMs[index] ?? 0)
    cues.push({ startMs: at, endMs, chapter, line, text, speaker: by ?? owner, key })
    at = endMs + (rest ?? restMs)
  }
  const durationMs = at + tailMs
  for (const [index, chapter] of chapters.entries()) chapter.endMs = chapters[index + 1]?.startMs ?? durationMs
  return { durationMs, chapters, cues }
}

/** When a sentence begins and ends. Throws where the story names a sentence that nobody says. */
export function momentOf(sheet: CutSheet, key: string): { startMs: number; endMs: number } {
  const first = sheet.cues.find((cue) => cue.key === key)
  const last = sheet.cues.findLast((cue) => cue.key === key)
  if (!first || !last) throw new Error(`no sentence is called ${key}`)
  return { startMs: first.startMs, endMs: last.endMs }
}
