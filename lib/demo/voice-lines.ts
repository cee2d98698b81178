import { execFile } from 'node:child_process'
import { createHash } from 'node:crypto'
import { mkdir, readFile, rename, rm, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { promisify } from 'node:util'
import { cutSheet, type CutSheet } from './cut-sheet'
import { voices } from './story/people'
import { phrasesOf } from './story/story'
import type { Speaker, StoryEpisode } from './story/types'
import { heardPart, sampleRate, samplesOf, wavOf } from './wav'

const run = promisify(execFile)

export type Voiced = { sheet: CutSheet; sound: string }

/**
 * Speaks an episode with flite and lays the sentences on one track. The cut sheet is measured on the samples, so the
 * captions made from it are true to a millisecond. Kept in `folder` by a hash of the words and voices.
 */
export async function voiceLines(episode: StoryEpisode, owner: Speaker, folder: string): Promise<Voiced> {
  const lines = phrasesOf(episode).map(({ voiced, by }) => ({ voiced, speaker: by ?? owner }))
  const name = `${episode.key}-${hashOf(lines)}`
  const sound = join(folder, `${name}.wav`)
  const notes = join(folder, `${name}.json`)
  const kept = await readFile(notes, 'utf8').catch(() => null)
  if (kept) return { sheet: cutSheet(episode, owner, JSON.parse(kept) as number[]), sound }

  await mkdir(folder, { recursive: true })
  const spoken: Int16Array[] = []
  for (const { voiced, speaker } of lines)
    spoken.push(await speak(voiced, speaker, join(folder, `${name}.${process.pid}.part`)))
  const spokenMs = spoken.map((samples) => Math.round((samples.length / sampleRate) * 1000))
  const sheet = cutSheet(episode, owner, spokenMs)
  await writeWhole(sound, wavOf(layOut(sheet, spoken)))
  await writeWhole(notes, JSON.stringify(spokenMs))
  return { sheet, sound }
}

async function speak(words: string, speaker: Speaker, part: string): Promise<Int16Array> {
  const { voice, pitch, pace } = voices[speaker]
  const settings = ['--setf', `f0_shift=${pitch}`, '--setf', `duration_stretch=${pace}`]
  await run('flite', ['-voice', voice, ...settings, '-t', words, '-o', part], { timeout: 60_000 })
  const samples = heardPart(samplesOf(await readFile(part)))
  await rm(part)
  return samples
}

function layOut(sheet: CutSheet, spoken: Int16Array[]): Int16Array {
  const track = new Int16Array(Math.ceil((sheet.durationMs * sampleRate) / 1000))
  for (const [index, samples] of spoken.entries()) {
    track.set(samples, Math.round(((sheet.cues[index]?.startMs ?? 0) * sampleRate) / 1000))
  }
  return track
}

function hashOf(lines: { voiced: string; speaker: Speaker }[]): string {
  const words = lines.map(({ voiced, speaker }) => [voiced, voices[speaker]])
  return createHash('sha256').update(JSON.stringify(words)).digest('hex').slice(0, 12)
}

/** A killed run leaves no half file under the final name. */
async function writeWhole(path: string, content: Buffer | string): Promise<void> {
  const unfinished = `${path}.${process.pid}.new`
  await writeFile(unfinished, content)
  await rename(unfinished, path)
}
