import { execFileSync, spawn } from 'node:child_process'
import { existsSync, readdirSync } from 'node:fs'
import { setTimeout as wait } from 'node:timers/promises'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { readEncoded } from '@/media/encode'
import { Clips } from './clips'

const clips = new Clips()
afterAll(() => clips.remove())
beforeAll(() => {
  clips.film('film.mp4', { size: '480x360', seconds: 5 })
})

const child = () =>
  spawn(process.execPath, ['--import', 'tsx', 'tests/media/encode-child.ts', clips.at('film.mp4'), clips.at('film')], {
    stdio: ['ignore', 'pipe', 'inherit'],
  })

const stillRunning = () => {
  try {
    return execFileSync('pgrep', ['-f', `${clips.folder}/making-`], { encoding: 'utf8' })
  } catch {
    return ''
  }
}

/** Lets a child encode until its progress passes `until`, then SIGKILLs it. */
async function killAt(until: number): Promise<void> {
  const working = child()
  working.stdout.setEncoding('utf8').on('data', (text: string) => {
    if (text.split('\n').some((line) => Number(line) >= until)) working.kill('SIGKILL')
  })
  await new Promise((resolve) => working.once('exit', resolve))
}

it(
  'leaves no film and no process when its worker is killed at any point, and is made whole by the next',
  { timeout: 600_000 },
  async () => {
    for (const until of [0.01, 0.6]) {
      await killAt(until)
      expect(existsSync(clips.at('film')), `killed at ${until}`).toBe(false)
      // The kernel tells ffmpeg that its parent is gone; give it the moment that takes.
      for (let tries = 0; tries < 50 && stillRunning() !== ''; tries += 1) await wait(100)
      expect(stillRunning(), `killed at ${until}`).toBe('')
    }
    await new Promise((resolve) => child().once('exit', resolve))
    expect((await readEncoded(clips.at('film')))?.renditions.map(({ height }) => height)).toEqual([240, 360])
    const leftovers = readdirSync(clips.folder).filter((name) => name.startsWith('making-'))
    // What the killed ones had begun lies apart, under names that are never served as a film; the job removes it.
    expect(leftovers.length).toBeLessThanOrEqual(2)
  },
)
