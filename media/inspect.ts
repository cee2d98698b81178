import { open, stat } from 'node:fs/promises'
import { MediaFailure } from './failure'
import { limits, takenAudioCodecs, takenFormats, takenVideoCodecs } from './limits'
import { probe, readPackets, type Probe, type ProbedStream } from './probe'

export type Film = {
  /** Seconds of picture, from the packets where the header does not hold. */
  duration: number
  /** Pixels as seen: turned upright, in square pixels. */
  width: number
  height: number
  rotation: 0 | 90 | 180 | 270
  frameRate: number
  videoCodec: string
  /** Stream numbers in the file, for mapping. */
  videoStream: number
  audio: { codec: string; channels: number; stream: number } | null
  interlaced: boolean
  /** Wide dynamic range that must be mapped down to be seen right everywhere. */
  highDynamicRange: boolean
  /** What was noticed, in sentences for the owner. */
  notes: string[]
}

export type RefusalCode =
  | 'not-a-film'
  | 'incomplete'
  | 'too-long'
  | 'too-many-pixels'
  | 'too-small'
  | 'too-many-streams'
  | 'no-picture'
  | 'codec-not-taken'
  | 'too-slow-to-read'

export type Inspection = { ok: true; film: Film } | { ok: false; code: RefusalCode; reason: string }

const refuse = (code: RefusalCode, reason: string): Inspection => ({ ok: false, code, reason })

const notAFilm = refuse(
  'not-a-film',
  'This file is not a film that can be read here. Send the file from the camera or phone itself: MP4, MOV, MKV, WebM, AVI or MTS.',
)

const incomplete = (percent: number) =>
  refuse(
    'incomplete',
    percent > 0
      ? `Only the first ${percent} % of this film is in the file. Copy it from the camera again, then send the copy.`
      : 'The end of this film is missing, and with it the index that says where its pictures are. Copy it from the camera again, then send the copy.',
  )

/**
 * Looks at a file before any work is spent on it. Refusals are answers for the owner, not exceptions; only trouble of our own
 * (no ffprobe, a read error) throws.
 */
export async function inspectFilm(path: string, most: { durationS: number } = limits): Promise<Inspection> {
  if ((await stat(path)).size === 0)
    return refuse('not-a-film', 'This file is empty. Choose the film again and send it once more.')
  let found: Probe
  try {
    found = await probe(path)
  } catch (error) {
    return refusalOf(path, error)
  }
  const formats = found.format.format_name.split(',')
  if (!formats.some((name) => (takenFormats as readonly string[]).includes(name))) return notAFilm
  if (found.streams.length > limits.streams) {
    return refuse(
      'too-many-streams',
      `This file holds ${found.streams.length} tracks; ${limits.streams} at most are taken. Export it with one picture and one sound track.`,
    )
  }
  const video = found.streams.find((stream) => stream.codec_type === 'video' && stream.disposition?.attached_pic !== 1)
  if (!video) return refuse('no-picture', 'There is sound in this file but no picture. Send the film with its picture.')
  return refuseByStream(video) ?? (await measured(path, found, video, most.durationS))
}

/** The types of box that an MP4 or QuickTime file begins with (ISO/IEC 14496-12). */
const firstBoxes = ['ftyp', 'moov', 'mdat', 'wide', 'free', 'skip', 'pnot']

async function beginsLikeMp4(path: string): Promise<boolean> {
  const file = await open(path, 'r')
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(8), 0, 8, 0)
    return bytesRead === 8 && firstBoxes.includes(buffer.toString('latin1', 4, 8))
  } finally {
    await file.close()
  }
}

async function refusalOf(path: string, error: unknown): Promise<Inspection> {
  if (!(error instanceof MediaFailure) || error.kind !== 'invalid') throw error
  // The name alone makes ffprobe look for an MP4's index, whatever is inside.
  if (/moov atom not found/i.test(error.technical) && (await beginsLikeMp4(path))) return incomplete(0)
  const untaken = /Codec \((\w+)\) not on whitelist/.exec(error.technical)?.[1]
  if (untaken) {
    return refuse(
      'codec-not-taken',
      `This file holds a track stored as ${untaken}, which is not taken here. Export the film as MP4 (H.264 and AAC) and send that.`,
    )
  }
  if (/SIGKILL/.test(error.technical)) {
    return refuse('too-slow-to-read', 'This file took too long to look through. Export it as MP4 and send that.')
  }
  return notAFilm
}

function refuseByStream(video: ProbedStream): Inspection | null {
  const { width = 0, height = 0 } = video
  if (!(takenVideoCodecs as readonly string[]).includes(video.codec_name)) {
    return refuse(
      'codec-not-taken',
      `The picture is stored as ${video.codec_name}, which is not taken here. Export the film as MP4 (H.264) and send that.`,
    )
  }
  if (!(width > 0 && height > 0))
    return refuse(
      'no-picture',
      'The picture in this file has no size, so it cannot be read. Export it as MP4 and send that.',
    )
  if (width * height > limits.pixels || Math.max(width, height) > limits.side) {
    return refuse(
      'too-many-pixels',
      `The picture is ${width} × ${height} pixels; 7680 × 4320 at most are taken. Export the film at a smaller size.`,
    )
  }
  if (Math.min(width, height) < limits.shortestSide) {
    return refuse(
      'too-small',
      `The picture is ${width} × ${height} pixels, too small to be watched. Choose the film itself, not a preview of it.`,
    )
  }
  return null
}

/** Header against packets: a header can promise an end that never arrived, or a length that was never filmed. */
async function measured(path: string, found: Probe, video: ProbedStream, mostS: number): Promise<Inspection> {
  const promised = firstNumber(video.duration, found.format.duration)
  const patience = limits.probeMs * 4
  let duration = promised
  const notes: string[] = []
  try {
    const tail = promised === null ? null : await readPackets(path, video.index, promised - 6, patience)
    const reachesEnd = promised !== null && tail !== null && tail.count > 0 && tail.end > promised * 0.98 - 0.5
    if (!reachesEnd) {
      const all = await readPackets(path, video.index, null, patience)
      if (all.count === 0) return promised === null ? notAFilm : incomplete(0)
      const real = all.end - Math.min(all.first, all.end)
      const frames = firstNumber(video.nb_frames)
      const allFramesRead = frames !== null && all.count >= frames * 0.98
      if (promised !== null && !allFramesRead && real < promised * 0.98 - 0.1) {
        return incomplete(Math.floor((100 * real) / promised))
      }
      if (promised !== null && Math.abs(real - promised) > 1)
        notes.push('The file states a length that it does not hold; the pictures in it were counted instead.')
      duration = real
    }
  } catch (error) {
    return refusalOf(path, error)
  }
  return lengthChecked(describe(found, video, duration ?? 0, notes), mostS)
}

function lengthChecked(film: Film, mostS: number): Inspection {
  if (film.duration > mostS) {
    return refuse(
      'too-long',
      `This film lasts ${(film.duration / 3600).toFixed(1)} hours; ${mostS / 3600} at most are taken. Cut it into parts and send each as its own episode.`,
    )
  }
  return { ok: true, film }
}

function describe(found: Probe, video: ProbedStream, duration: number, notes: string[]): Film {
  const rotation = turnOf(video)
  const [sarWide, sarHigh] = ratio(video.sample_aspect_ratio)
  const stored = { wide: Math.round((video.width ?? 0) * (sarWide / sarHigh)), high: video.height ?? 0 }
  const sideways = rotation === 90 || rotation === 270
  const average = fraction(video.avg_frame_rate) ?? fraction(video.r_frame_rate) ?? 25
  const sounds = found.streams.filter((stream) => stream.codec_type === 'audio' && soundTaken(stream.codec_name))
  const sound = sounds[0]
  const film: Film = {
    duration: Math.max(duration, 1 / Math.max(1, average)) + lateStart(found, video),
    width: sideways ? stored.high : stored.wide,
    height: sideways ? stored.wide : stored.high,
    rotation,
    frameRate: Math.min(average, limits.framesPerSecond),
    videoCodec: video.codec_name,
    videoStream: video.index,
    audio: sound ? { codec: sound.codec_name, channels: sound.channels ?? 1, stream: sound.index } : null,
    interlaced: ['tt', 'bb', 'tb', 'bt'].includes(video.field_order ?? ''),
    highDynamicRange: ['smpte2084', 'arib-std-b67'].includes(video.color_transfer ?? ''),
    notes,
  }
  notes.push(...notesOn(film, video, found, sounds.length, sarWide !== sarHigh))
  return film
}

function notesOn(film: Film, video: ProbedStream, found: Probe, sounds: number, squeezed: boolean): string[] {
  const nominal = fraction(video.r_frame_rate)
  const heard = found.streams.some((stream) => stream.codec_type === 'audio')
  const said: [boolean, string][] = [
    [film.rotation !== 0, 'Filmed with the camera turned; it is shown the right way up.'],
    [
      nominal !== null && Math.abs(nominal / film.frameRate - 1) > 0.02,
      'The number of pictures a second varies; it is made even.',
    ],
    [film.interlaced, 'Filmed in half pictures (interlaced); they are joined.'],
    [film.highDynamicRange, 'Filmed with a wide range of brightness; it is brought into the range every screen shows.'],
    [squeezed, 'Stored in pixels that are not square; it is shown in its right shape.'],
    [
      /10|12|444|422/.test(video.pix_fmt ?? ''),
      'Stored with finer colour than screens play; it is made playable everywhere.',
    ],
    [sounds > 1, `Holds ${sounds} sound tracks; the first is used.`],
    [!heard, 'There is no sound in this film.'],
    [heard && sounds === 0, 'The sound in this film is stored in a form that is not taken here, so it is left out.'],
  ]
  return said.flatMap(([applies, sentence]) => (applies ? [sentence] : []))
}

/** Seconds by which the picture begins after the file does; the first picture is held for as long, so that sound stays true. */
function lateStart(found: Probe, video: ProbedStream): number {
  const late = (video.start_time ?? 0) - (found.format.start_time ?? 0)
  return late > 0.05 && late < 10 ? late : 0
}

const soundTaken = (codec: string) =>
  (takenAudioCodecs as readonly string[]).includes(codec) || codec.startsWith('pcm_')

function turnOf(video: ProbedStream): Film['rotation'] {
  const turned = video.side_data_list?.find((data) => data.rotation !== undefined)?.rotation ?? 0
  const quarter = ((Math.round(turned / 90) % 4) + 4) % 4
  return ([0, 90, 180, 270] as const)[quarter] ?? 0
}

const firstNumber = (...values: (number | undefined)[]) =>
  values.find((value) => value !== undefined && Number.isFinite(value) && value > 0) ?? null

function ratio(text: string | undefined): [number, number] {
  const [a = 0, b = 0] = (text ?? '').split(':').map(Number)
  return a > 0 && b > 0 && a / b < 8 && b / a < 8 ? [a, b] : [1, 1]
}

function fraction(text: string | undefined): number | null {
  const [num = 0, den = 0] = (text ?? '').split('/').map(Number)
  return num > 0 && den > 0 ? num / den : null
}
