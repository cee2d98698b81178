import { spawn } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync } from 'node:fs'
import { rename, rm } from 'node:fs/promises'
import { basename, join } from 'node:path'
import sharp from 'sharp'
import type { CutSheet } from './cut-sheet'
import { height, picture, width, type Clock } from './scenes/brush'
import { scenes } from './scenes/scenes'
import type { StoryEpisode } from './story/types'
import type { Voiced } from './voice-lines'

/** Frames a second: enough for drawn pictures, and a quarter of the cost of twenty. */
const rate = 5

/** The pictures of a film as SVG, one per drawn frame; many are equal, and equal ones are rendered once. */
export function framesOf(episode: StoryEpisode, sheet: CutSheet): string[] {
  const count = Math.ceil((sheet.durationMs / 1000) * rate)
  return Array.from({ length: count }, (_, index) => frameAt(episode, sheet, (index * 1000) / rate))
}

/** The picture at a moment, milliseconds. */
export function frameAt(episode: StoryEpisode, sheet: CutSheet, ms: number): string {
  const index = Math.max(
    0,
    sheet.chapters.findLastIndex((chapter) => chapter.startMs <= ms),
  )
  const chapter = sheet.chapters[index]
  const scene = scenes[episode.chapters[index]?.scene ?? '']
  if (!chapter || !scene) throw new Error(`${episode.key} has no picture at ${ms} ms`)
  const said = sheet.cues.filter((cue) => cue.chapter === index)
  const line = said.findLast((cue) => cue.startMs <= ms)?.line ?? 0
  const began = said.find((cue) => cue.line === line)?.startMs ?? 0
  const clock: Clock = {
    t: (ms - chapter.startMs) / 1000,
    of: (chapter.endMs - chapter.startMs) / 1000,
    line,
    since: Math.max(0, (ms - began) / 1000),
  }
  return picture(scene(clock))
}

/**
 * Draws a film to `folder` and returns its path: flat pictures and the voice, H.264 and AAC. Named after everything that
 * is in it, so that a film already drawn is found and a changed one is drawn anew.
 */
export async function drawFilm(episode: StoryEpisode, voiced: Voiced, folder: string): Promise<string> {
  const frames = framesOf(episode, voiced.sheet)
  const hash = createHash('sha256').update(basename(voiced.sound)).update(frames.join('')).digest('hex').slice(0, 12)
  const film = join(folder, `${episode.key}-${hash}.mp4`)
  if (existsSync(film)) return film
  const part = join(folder, `${episode.key}-${hash}.${process.pid}.part.mp4`)
  try {
    await encode(frames, encoderArguments(voiced.sound, part))
    await rename(part, film)
    return film
  } finally {
    await rm(part, { force: true })
  }
}

/** Gives the pictures to ffmpeg as fast as it takes them. Throws with its last words when it fails. */
async function encode(frames: string[], args: string[]): Promise<void> {
  const encoder = spawn('ffmpeg', args, { stdio: ['pipe', 'ignore', 'pipe'] })
  const said: Buffer[] = []
  encoder.stderr.on('data', (chunk: Buffer) => said.push(chunk))
  const ended = new Promise<number | null>((resolve, reject) => encoder.once('error', reject).once('close', resolve))
  // A broken pipe shows as the exit code below; without a listener it would end the process.
  encoder.stdin.on('error', () => undefined)
  for await (const pixels of rendered(frames)) {
    if (encoder.stdin.write(pixels)) continue
    await Promise.race([new Promise((resolve) => encoder.stdin.once('drain', resolve)), ended])
  }
  encoder.stdin.end()
  const status = await ended
  if (status !== 0) throw new Error(`ffmpeg ended with ${status}: ${Buffer.concat(said).toString('utf8').slice(-600)}`)
}

// More threads cost a fifth more for pictures as small as these, and the encoder wants the other core.
sharp.concurrency(1)

async function* rendered(frames: string[]): AsyncGenerator<Buffer> {
  const kept = new Map<string, Buffer>()
  for (const svg of frames) {
    const pixels =
      kept.get(svg) ?? (await sharp(Buffer.from(svg), { sequentialRead: true }).removeAlpha().raw().toBuffer())
    kept.delete(svg)
    kept.set(svg, pixels)
    // 24 frames are nearly five seconds, longer than any loop, and 66 MB.
    if (kept.size > 24) kept.delete(kept.keys().next().value ?? '')
    yield pixels
  }
}

function encoderArguments(sound: string, film: string): string[] {
  return [
    ...['-v', 'error', '-nostdin', '-y'],
    ...['-f', 'rawvideo', '-pix_fmt', 'rgb24', '-s', `${width}x${height}`, '-framerate', String(rate), '-i', 'pipe:0'],
    ...['-i', sound],
    // Flat pictures need no fine motion search; a key frame every four seconds.
    ...['-c:v', 'libx264', '-preset', 'veryfast', '-crf', '25', '-x264-params', 'me=dia:subme=1'],
    ...['-g', String(rate * 4), '-pix_fmt', 'yuv420p'],
    ...['-c:a', 'aac', '-b:a', '64k', '-ar', '48000', '-ac', '1'],
    // Bit-exact, without dates and on one thread, so that the same story gives the same file.
    ...['-threads', '1', '-map_metadata', '-1', '-fflags', '+bitexact', '-flags', '+bitexact'],
    ...['-movflags', '+faststart', film],
  ]
}
