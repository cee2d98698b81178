import { mkdir, readFile, rename, rm, writeFile } from 'node:fs/promises'
import { basename, dirname, join } from 'node:path'
import { randomBytes } from 'node:crypto'
import { cancelled, diskFull, MediaFailure } from './failure'
import { runFfmpeg } from './ffmpeg'
import { sync, syncTree } from './files'
import { pictureGraph, soundGraph } from './filters'
import {
  bytesOf,
  lengthOf,
  masterPlaylist,
  measureRate,
  mediaPlaylist,
  targetDuration,
  type MasterAudio,
  type MasterVariant,
} from './hls'
import type { Film } from './inspect'
import { ladderFor, perSecond, type Rung } from './ladder'
import { makePlain, makePoster } from './stills'
import { readSound, readVideo, segmentTime, soundOutput, videoOutput } from './tracks'

/** One finished size. Rates in bits per second, sizes in bytes. `height` is the short side that people know the size by. */
export type Rendition = {
  height: number
  pixelsWide: number
  pixelsHigh: number
  bitrate: number
  bytes: number
  codec: string
}
export type Step = 'first-size' | 'stills' | 'more-sizes' | 'finishing'

export type EncodedFilm = {
  durationS: number
  bytes: number
  renditions: Rendition[]
  /** Listen only. */
  sound: { bitrate: number; bytes: number; channels: number } | null
}

export type EncodeOrder = {
  /** Absolute path of the footage, and what inspection found in it. */
  source: string
  film: Film
  /** Absolute path of the folder that will hold the finished film. It must not exist. */
  folder: string
  /** BCP 47 tag of what is spoken. */
  language: string
  /** 0..1, never backwards; 1 only when the finished folder is in place. */
  onProgress?: (fraction: number, step: Step) => void
  /** A size is complete and can be played from the working folder. */
  onRendition?: (rendition: Rendition, workingFolder: string) => void
  signal?: AbortSignal
}

/** Where unfinished films lie: beside the finished ones, so that the last rename stays on one file system. */
export const workingPrefix = 'making-'

/**
 * Makes a film of footage: HLS sizes smallest first, sound as its own track, a poster and one plain MP4. Everything is made in
 * a working folder, brought to disk and renamed once, so a folder under its final name is always whole. On any failure the
 * working folder is removed. @throws MediaFailure
 */
export async function encodeFilm(order: EncodeOrder): Promise<EncodedFilm> {
  const working = join(
    dirname(order.folder),
    `${workingPrefix}${basename(order.folder)}-${randomBytes(4).toString('hex')}`,
  )
  try {
    await mkdir(working, { recursive: true })
    const made = await makeTracks(order, working)
    const encoded = await finish(order, working, made)
    order.onProgress?.(1, 'finishing')
    return encoded
  } catch (error) {
    await rm(working, { recursive: true, force: true })
    if (error instanceof Error && 'code' in error && error.code === 'ENOSPC') throw diskFull(error.message)
    throw error
  }
}

type Made = { variants: MasterVariant[]; audio: MasterAudio | null }

async function makeTracks(order: EncodeOrder, working: string): Promise<Made> {
  const rungs = ladderFor(order.film)
  const [smallest, ...others] = rungs
  if (!smallest) throw new Error('A film without sizes')
  const report = reporter(order, rungs)
  await makeSizes(order, working, [smallest], order.film.audio, report.at('first-size'))
  const { audio: filmed } = order.film
  const audio = filmed ? await readSound(working, filmed.channels > 1 ? 2 : 1, order.language) : null
  const first = await readVideo(working, smallest)
  const variants = [first]
  // Something to look at, and a listing that is true for what is there, before the long part begins.
  await makePlain(working, first, audio, order)
  await makePoster(working, order, report.at('stills'))
  await writePlaylists(working, { variants, audio })
  order.onRendition?.(renditionOf(smallest, first), working)
  await makeSizes(order, working, others, null, report.at('more-sizes'))
  for (const rung of others) {
    const variant = await readVideo(working, rung)
    variants.push(variant)
    order.onRendition?.(renditionOf(rung, variant), working)
  }
  return { variants, audio }
}

async function makeSizes(
  order: EncodeOrder,
  working: string,
  rungs: Rung[],
  sound: Film['audio'],
  onProgress: (fraction: number) => void,
): Promise<void> {
  const { film, source, signal } = order
  for (const rung of rungs) await mkdir(join(working, String(rung.height)), { recursive: true })
  if (sound) await mkdir(join(working, 'audio'), { recursive: true })
  const cut = segmentTime(rungs[0]?.frameRate ?? { num: 25, den: 1 })
  await runFfmpeg({
    inputs: [{ path: source }],
    graph: [pictureGraph(film, rungs), ...(sound ? [soundGraph(sound, film.duration)] : [])].join(';'),
    outputs: [
      ...rungs.map((rung, index) => videoOutput(working, rung, `[v${index}]`, film.duration)),
      ...(sound ? [soundOutput(working, sound.channels, cut)] : []),
    ],
    writes: working,
    durationS: film.duration,
    onProgress,
    signal,
  })
}

/** Shares of the work by pixels made, with the decode counted once for each pass over the source (measured weights). */
function reporter(order: EncodeOrder, rungs: Rung[]): { at: (step: Step) => (fraction: number) => void } {
  const cost = (rung: Rung) => rung.pixelsWide * rung.pixelsHigh * perSecond(rung.frameRate)
  const decode = 0.2 * order.film.width * order.film.height * order.film.frameRate
  const [smallest, ...others] = rungs
  const first = decode + (smallest ? cost(smallest) : 0)
  const rest = decode + others.reduce((sum, rung) => sum + cost(rung), 0)
  const whole = (first + rest) / 0.97
  const from = { 'first-size': 0, stills: first / whole, 'more-sizes': first / whole + 0.01, finishing: 0.98 }
  const share = { 'first-size': first / whole, stills: 0.01, 'more-sizes': rest / whole, finishing: 0 }
  let highest = 0
  return {
    at: (step) => (fraction) => {
      highest = Math.max(highest, Math.min(0.99, from[step] + share[step] * fraction))
      order.onProgress?.(highest, step)
    },
  }
}

const renditionOf = (rung: Rung, variant: MasterVariant): Rendition => ({
  height: rung.height,
  pixelsWide: variant.width,
  pixelsHigh: variant.height,
  bitrate: measureRate(variant, targetDuration([variant])).average,
  bytes: bytesOf(variant) + variant.initBytes,
  codec: variant.codec,
})

async function writePlaylists(working: string, { variants, audio }: Made): Promise<void> {
  const tracks = audio ? [...variants, audio] : variants
  const target = targetDuration(tracks)
  for (const track of tracks) await writeFile(join(working, track.folder, 'index.m3u8'), mediaPlaylist(track, target))
  await writeFile(join(working, 'master.m3u8'), masterPlaylist(variants, audio))
}

/** A cut-off film decodes without an error, only shorter: the length made is held against the length found. */
function refuseShort(order: EncodeOrder, { variants }: Made): void {
  const wanted = order.film.duration
  for (const variant of variants) {
    const short = wanted - lengthOf(variant)
    if (short <= Math.max(0.5, wanted * 0.02)) continue
    throw new MediaFailure(
      'invalid',
      'stops-early',
      `The picture stops at ${Math.floor(lengthOf(variant))} of ${Math.floor(wanted)} seconds. Copy the film from the camera again, then send the copy.`,
      `${variant.folder}: ${lengthOf(variant)} of ${wanted}`,
    )
  }
}

async function finish(order: EncodeOrder, working: string, made: Made): Promise<EncodedFilm> {
  refuseShort(order, made)
  await writePlaylists(working, made)
  const sound = made.audio && {
    ...measureRate(made.audio, 4),
    bytes: bytesOf(made.audio),
    channels: made.audio.channels,
  }
  const rungs = ladderFor(order.film)
  const renditions = made.variants.flatMap((variant, index) => {
    const rung = rungs[index]
    return rung ? [renditionOf(rung, variant)] : []
  })
  const encoded: EncodedFilm = {
    durationS: Math.round(Math.max(...made.variants.map(lengthOf)) * 1000) / 1000,
    bytes: renditions.reduce((sum, rendition) => sum + rendition.bytes, sound?.bytes ?? 0),
    renditions,
    sound: sound && { bitrate: sound.average, bytes: sound.bytes, channels: sound.channels },
  }
  await writeFile(join(working, manifest), JSON.stringify(encoded))
  await syncTree(working)
  if (order.signal?.aborted) throw cancelled()
  return settle(working, order.folder, encoded)
}

const manifest = 'film.json'

/** The one rename. Where another worker was first, its film stands and ours goes: both were made of the same bytes. */
async function settle(working: string, folder: string, encoded: EncodedFilm): Promise<EncodedFilm> {
  try {
    await rename(working, folder)
    await sync(dirname(folder))
    return encoded
  } catch (error) {
    const standing = await readEncoded(folder)
    if (!standing) throw error
    await rm(working, { recursive: true, force: true })
    return standing
  }
}

/** What a finished folder holds, or null where there is none: a worker killed after the rename finds its work done. */
export async function readEncoded(folder: string): Promise<EncodedFilm | null> {
  try {
    return JSON.parse(await readFile(join(folder, manifest), 'utf8')) as EncodedFilm
  } catch {
    return null
  }
}
