import { createReadStream, createWriteStream } from 'node:fs'
import { mkdir, rm } from 'node:fs/promises'
import { join } from 'node:path'
import { pipeline } from 'node:stream/promises'
import type { EncodeOrder } from './encode'
import { runFfmpeg } from './ffmpeg'
import { pictureGraph } from './filters'
import type { Track } from './hls'
import { ladderFor, steadyRate } from './ladder'
import { probe } from './probe'

/** One picture for before it plays: from a fifth into the film, where the talking has begun, the least odd of a few. */
export async function makePoster(
  working: string,
  order: EncodeOrder,
  onProgress: (fraction: number) => void,
): Promise<void> {
  const { film, source, signal } = order
  const rungs = ladderFor(film).filter((rung) => rung.height <= 720)
  const largest = rungs.at(-1)
  if (!largest) return
  const atS = film.duration > 2 ? film.duration * 0.2 : 0
  const graph = pictureGraph(film, [{ ...largest, frameRate: steadyRate(film.frameRate) }])
  await runFfmpeg({
    inputs: [{ path: source, options: ['-ss', atS.toFixed(3), '-t', '3'] }],
    graph: `${graph};[v0]thumbnail=24[poster]`,
    outputs: [
      {
        path: join(working, 'poster.jpg'),
        options: ['-map', '[poster]', '-frames:v', '1', '-q:v', '4', '-f', 'mjpeg'],
      },
    ],
    writes: working,
    durationS: 1,
    onProgress,
    signal,
  })
}

async function joinSegments(working: string, track: Track, to: string): Promise<void> {
  async function* bytes() {
    for (const name of ['init.mp4', ...track.segments.map((segment) => segment.name)]) {
      yield* createReadStream(join(working, track.folder, name))
    }
  }
  await pipeline(bytes, createWriteStream(to))
}

/** ffmpeg moves a track with signed offsets back until nothing is negative; this moves it to where it belongs. Seconds. */
async function minusStart(path: string): Promise<string> {
  const { streams } = await probe(path)
  return (-(streams[0]?.start_time ?? 0)).toFixed(6)
}

/**
 * The smallest size with its sound as one MP4 whose index comes first: what a browser plays without any script. Segments laid
 * end to end behind their initialisation are one fragmented file, so nothing is encoded twice.
 */
export async function makePlain(working: string, video: Track, sound: Track | null, order: EncodeOrder): Promise<void> {
  const parts = join(working, 'parts')
  await mkdir(parts, { recursive: true })
  const tracks = [video, ...(sound ? [sound] : [])]
  const inputs = tracks.map((track) => ({ track, path: join(parts, `${track.folder}.mp4`) }))
  for (const { track, path } of inputs) await joinSegments(working, track, path)
  await runFfmpeg({
    inputs: await Promise.all(
      inputs.map(async ({ path }) => ({ path, options: ['-itsoffset', await minusStart(path)] })),
    ),
    outputs: [
      {
        path: join(working, 'plain.mp4'),
        options: [
          '-map',
          '0:v:0',
          ...(sound ? ['-map', '1:a:0'] : []),
          '-c',
          'copy',
          '-movflags',
          '+faststart',
          '-f',
          'mp4',
        ],
      },
    ],
    writes: working,
    durationS: order.film.duration,
    signal: order.signal,
  })
  await rm(parts, { recursive: true })
}
