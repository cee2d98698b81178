import { execFileSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

/** A temporary folder with clips made on the spot; nothing is downloaded and nothing is committed. */
export class Clips {
  readonly folder = mkdtempSync(join(tmpdir(), 'clips-'))

  at(name: string): string {
    return join(this.folder, name)
  }

  ffmpeg(...args: string[]): void {
    execFileSync('ffmpeg', ['-v', 'error', '-y', ...args], { cwd: this.folder, stdio: ['ignore', 'ignore', 'pipe'] })
  }

  text(name: string, content: string | Buffer): string {
    writeFileSync(this.at(name), content)
    return this.at(name)
  }

  /** Someone talking, by Debian's synthesiser: real speech, so that sound is neither a tone nor silence. */
  speech(name: string, words: string): string {
    execFileSync('flite', ['-voice', 'slt', '-t', words, '-o', this.at(name)])
    return this.at(name)
  }

  /** A moving picture with the given sound file or none. */
  film(
    name: string,
    order: { size: string; rate?: string; seconds: number; sound?: string; options?: string[] },
  ): string {
    const picture = [
      '-f',
      'lavfi',
      '-i',
      `testsrc2=size=${order.size}:rate=${order.rate ?? '25'}:duration=${order.seconds}`,
    ]
    const sound = order.sound ? ['-i', order.sound, '-c:a', 'aac', '-b:a', '96k'] : []
    const video = ['-c:v', 'libx264', '-preset', 'ultrafast', '-pix_fmt', 'yuv420p', '-g', '50']
    this.ffmpeg(...picture, ...sound, ...video, ...(order.options ?? []), '-t', String(order.seconds), name)
    return this.at(name)
  }

  remove(): void {
    rmSync(this.folder, { recursive: true, force: true })
  }
}

type Json = Record<string, unknown>

/** What an independent ffprobe says about a file or playlist. */
export function ffprobe(
  path: string,
  ...options: string[]
): { streams: Json[]; format: Json; packets: Json[]; frames: Json[] } {
  const args = ['-v', 'error', '-of', 'json', '-show_streams', '-show_format', ...options, path]
  return JSON.parse(execFileSync('ffprobe', args, { encoding: 'utf8', maxBuffer: 64 * 2 ** 20 }))
}
