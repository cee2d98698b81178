import { execFile } from 'node:child_process'
import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { promisify } from 'node:util'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { drawFilm } from '@/lib/demo/draw-films'
import { filmed } from '@/lib/demo/story/story'
import { voiceLines, type Voiced } from '@/lib/demo/voice-lines'
import { sampleRate } from '@/lib/demo/wav'

const run = promisify(execFile)
const full = filmed.find((episode) => episode.key === 'first-node')
// One chapter is enough to see sound and picture meet, and a third of the drawing.
const episode = full && { ...full, key: 'one-chapter', chapters: full.chapters.slice(1, 2) }

let folder = ''
let voiced: Voiced
let film = ''

beforeAll(async () => {
  if (!episode) throw new Error('the story has lost its film')
  folder = await mkdtemp(join(tmpdir(), 'turnrow-demo-film-'))
  voiced = await voiceLines(episode, 'nell', folder)
  film = await drawFilm(episode, voiced, folder)
})

afterAll(() => rm(folder, { recursive: true, force: true }))

/** The loudest sample between two moments of the finished film, of 32,768. */
async function loudest(fromMs: number, toMs: number): Promise<number> {
  const cut = ['-ss', String(fromMs / 1000), '-t', String((toMs - fromMs) / 1000)]
  const pcm = ['-ac', '1', '-ar', String(sampleRate), '-f', 's16le', '-']
  const { stdout } = await run('ffmpeg', ['-v', 'error', '-i', film, ...cut, ...pcm], { encoding: 'buffer' })
  let peak = 0
  for (let at = 0; at + 1 < stdout.length; at += 2) peak = Math.max(peak, Math.abs(stdout.readInt16LE(at)))
  return peak
}

describe('a film of the demo', () => {
  it('is speech inside every caption, from its first tenth of a second to its last', async () => {
    for (const { startMs, endMs, text } of voiced.sheet.cues) {
      expect(await loudest(startMs, startMs + 160), `start of "${text}"`).toBeGreaterThan(300)
      expect(await loudest(endMs - 160, endMs), `end of "${text}"`).toBeGreaterThan(200)
    }
  })

  it('is silent between captions, before the first and after the last', async () => {
    const { cues, durationMs } = voiced.sheet
    for (const [index, cue] of cues.entries()) {
      const before = cues[index - 1]?.endMs ?? 0
      expect(await loudest(before + 90, cue.startMs - 60), `before "${cue.text}"`).toBeLessThan(200)
    }
    expect(await loudest((cues.at(-1)?.endMs ?? 0) + 90, durationMs)).toBeLessThan(200)
  })

  it('has a picture and a sound of the same length as the cut sheet', async () => {
    const args = ['-v', 'error', '-show_entries', 'stream=codec_name,width,height,duration', '-of', 'json', film]
    const { streams } = JSON.parse((await run('ffprobe', args)).stdout) as {
      streams: { codec_name: string; width?: number; height?: number; duration: string }[]
    }
    expect(streams.map((stream) => stream.codec_name)).toEqual(['h264', 'aac'])
    expect(streams[0]).toMatchObject({ width: 1280, height: 720 })
    for (const { duration } of streams)
      expect(Math.abs(Number(duration) - voiced.sheet.durationMs / 1000)).toBeLessThan(0.25)
  })

  it('is found again by its content, and drawn to the same bytes elsewhere', async () => {
    if (!episode) throw new Error('the story has lost its film')
    expect(await drawFilm(episode, voiced, folder)).toBe(film)
    const elsewhere = await mkdtemp(join(tmpdir(), 'turnrow-demo-film-'))
    try {
      const again = await drawFilm(episode, await voiceLines(episode, 'nell', elsewhere), elsewhere)
      await run('cmp', [film, again])
    } finally {
      await rm(elsewhere, { recursive: true, force: true })
    }
  })
})
