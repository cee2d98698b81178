import { execFileSync } from 'node:child_process'
import { existsSync, readdirSync } from 'node:fs'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { encodeFilm } from '@/media/encode'
import { MediaFailure } from '@/media/failure'
import { runFfmpeg } from '@/media/ffmpeg'
import { inspectFilm, type Film } from '@/media/inspect'
import { Clips } from './clips'

const clips = new Clips()
afterAll(() => clips.remove())
let film: Film

beforeAll(async () => {
  clips.film('long.mp4', { size: '640x480', seconds: 30 })
  const found = await inspectFilm(clips.at('long.mp4'))
  if (!found.ok) throw new Error(found.reason)
  film = found.film
})

const running = () => {
  try {
    return execFileSync('pgrep', ['-f', clips.folder], { encoding: 'utf8' }).trim().split('\n')
  } catch {
    return []
  }
}

it('leaves no process, no folder and no film behind when it is cancelled', async () => {
  const stop = new AbortController()
  const order = {
    source: clips.at('long.mp4'),
    film,
    folder: clips.at('cancelled'),
    language: 'en',
    signal: stop.signal,
  }
  const ended = encodeFilm({ ...order, onProgress: (fraction) => fraction > 0.02 && stop.abort() })
  await expect(ended).rejects.toMatchObject({ kind: 'cancelled' })
  expect(running()).toEqual([])
  expect(readdirSync(clips.folder).filter((name) => name !== 'long.mp4')).toEqual([])
})

it('does not begin when it was cancelled before', async () => {
  const signal = AbortSignal.abort()
  const ended = encodeFilm({ source: clips.at('long.mp4'), film, folder: clips.at('never'), language: 'en', signal })
  await expect(ended).rejects.toMatchObject({ kind: 'cancelled' })
  expect(existsSync(clips.at('never'))).toBe(false)
})

it('kills a run that makes no progress, and calls it ours to try again', async () => {
  const ended = runFfmpeg({
    inputs: [{ path: clips.at('long.mp4'), options: ['-re'] }],
    // Holds the first picture back for good: the clock of the watchdog is all that can end this.
    graph: '[0:v]select=eq(n\\,-1)[v]',
    outputs: [{ path: clips.at('stalled.mp4'), options: ['-map', '[v]', '-c:v', 'libx264'] }],
    writes: clips.folder,
    durationS: 30,
    stallMs: 600,
  })
  const failure = await ended.catch((error: unknown) => error)
  expect(failure).toBeInstanceOf(MediaFailure)
  expect(failure).toMatchObject({ kind: 'interrupted', code: 'stalled', isPermanent: false })
  expect(running()).toEqual([])
})

it('reports a film whose picture breaks off as permanently unfit, and leaves nothing', async () => {
  const source = clips.film('brief.mp4', { size: '640x480', seconds: 2 })
  const ended = encodeFilm({ source, film: { ...film, duration: 60 }, folder: clips.at('short'), language: 'en' })
  await expect(ended).rejects.toMatchObject({ kind: 'invalid', code: 'stops-early', isPermanent: true })
  expect(readdirSync(clips.folder).filter((name) => name.includes('short'))).toEqual([])
})
