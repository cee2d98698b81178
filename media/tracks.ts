import { readFile, stat } from 'node:fs/promises'
import { join } from 'node:path'
import { describeH264 } from './boxes'
import { soundRate } from './filters'
import { readSegments, type MasterAudio, type MasterVariant, type Segment, type Track } from './hls'
import { perSecond, type Rate, type Rung } from './ladder'

/** Pictures between two key pictures: two seconds, counted in whole pictures so that every size is cut at the same ones. */
const keyDistance = (rate: Rate): number => Math.max(2, 2 * Math.round(perSecond(rate)))

/** Exact length of a segment of two key distances, seconds: 4, or 4.004 for 29.97. Rounded, cuts would drift over an hour. */
export const segmentTime = (rate: Rate): number => Number(((2 * keyDistance(rate) * rate.den) / rate.num).toFixed(6))

function hlsOptions(folder: string, cutS: number): string[] {
  return [
    ...['-f', 'hls', '-hls_time', String(cutS), '-hls_playlist_type', 'vod', '-hls_segment_type', 'fmp4'],
    ...['-hls_fmp4_init_filename', 'init.mp4', '-hls_flags', 'independent_segments'],
    // By default the picture begins two pictures late and an edit list says so, which browsers pass over when they are fed
    // segments; sound would run ahead of it. Signed offsets let the first picture stand at zero without any list.
    ...['-hls_segment_options', 'movflags=+negative_cts_offsets:use_editlist=0'],
    ...['-hls_segment_filename', join(folder, '%05d.m4s')],
  ]
}

type Output = { path: string; options: string[] }

/** H.264 at constant quality under a cap: a still field costs what it is worth, a moving one no more than the line carries. */
export function videoOutput(working: string, rung: Rung, label: string, durationS: number): Output {
  const folder = join(working, String(rung.height))
  const gop = String(keyDistance(rung.frameRate))
  return {
    path: join(folder, 'index.m3u8'),
    options: [
      ...['-map', label, '-an', '-t', durationS.toFixed(6)],
      ...['-c:v', 'libx264', '-preset', 'veryfast', '-profile:v', 'high', '-crf', '23', '-pix_fmt', 'yuv420p'],
      ...['-maxrate', `${rung.capKbit}k`, '-bufsize', `${rung.capKbit * 2}k`],
      ...['-g', gop, '-keyint_min', gop, '-sc_threshold', '0'],
      ...hlsOptions(folder, segmentTime(rung.frameRate)),
    ],
  }
}

export function soundOutput(working: string, channels: number, cutS: number): Output {
  const folder = join(working, 'audio')
  return {
    path: join(folder, 'index.m3u8'),
    options: [
      ...['-map', '[sound]', '-vn', '-c:a', 'aac', '-b:a', channels > 1 ? '96k' : '64k', '-ar', String(soundRate)],
      ...hlsOptions(folder, cutS),
    ],
  }
}

async function readTrack(working: string, folder: string): Promise<Track & { init: Buffer }> {
  const at = join(working, folder)
  const init = await readFile(join(at, 'init.mp4'))
  const segments: Segment[] = []
  for (const { name, durationS } of readSegments(await readFile(join(at, 'index.m3u8'), 'utf8'))) {
    segments.push({ name, durationS, bytes: (await stat(join(at, name))).size })
  }
  return { folder, segments, initBytes: init.length, init }
}

export async function readVideo(working: string, rung: Rung): Promise<MasterVariant> {
  const { init, ...track } = await readTrack(working, String(rung.height))
  return { ...track, ...describeH264(init), frameRate: perSecond(rung.frameRate) }
}

/** Channels as they were asked for: the sample entry that ffmpeg writes says two whatever is in it (seen). */
export async function readSound(working: string, channels: number, language: string): Promise<MasterAudio> {
  const { folder, segments, initBytes } = await readTrack(working, 'audio')
  return { folder, segments, initBytes, codec: 'mp4a.40.2', channels, language }
}
