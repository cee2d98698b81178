/**
 * What is taken in, in one place. A file that names other files (playlists, concat lists, image patterns) reads what is not
 * its own when ffmpeg is left to guess, so demuxers are named here and nothing else is opened; a protocol list alone does
 * not stop it.
 */
export const takenFormats = [
  'mov',
  'mp4',
  'm4a',
  '3gp',
  '3g2',
  'mj2',
  'matroska',
  'webm',
  'avi',
  'mpegts',
  'mpeg',
] as const

/** Picture codecs by ffprobe's codec name. */
export const takenVideoCodecs = [
  'h264', 'hevc', 'vp8', 'vp9', 'av1', 'mpeg4', 'mpeg2video', 'mpeg1video', 'h263', 'mjpeg', 'prores', 'dvvideo',
] as const // prettier-ignore

/** Sound codecs by ffprobe's codec name; every plain PCM form is taken as well. */
export const takenAudioCodecs = [
  'aac', 'mp3', 'mp2', 'opus', 'vorbis', 'flac', 'alac', 'ac3', 'eac3', 'amr_nb', 'amr_wb',
] as const // prettier-ignore

const pcm = ['s16le', 's16be', 's24le', 's24be', 's32le', 's32be', 'f32le', 'f32be', 'u8', 's8', 'mulaw', 'alaw']

/** ffmpeg's `-codec_whitelist` asks for names of decoders, which are not always the codec's. */
export const takenDecoders = [
  ...takenVideoCodecs,
  ...['libdav1d', 'libvpx', 'libvpx-vp9'],
  ...takenAudioCodecs.filter((name) => !name.startsWith('amr')),
  ...['mp3float', 'mp2float', 'libopus', 'libvorbis', 'amrnb', 'amrwb'],
  ...pcm.map((name) => `pcm_${name}`),
  // Never decoded into anything, but ffprobe opens every track and gives up on the first that it may not. Camcorders (AVCHD)
  // write the date as a picture subtitle, phones and editors write text.
  ...['srt', 'subrip', 'ass', 'ssa', 'mov_text', 'webvtt', 'text', 'pgssub', 'dvdsub'],
] as const

export const limits = {
  /** Longest film, seconds. */
  durationS: 6 * 3600,
  /** 8K UHD. A 64 kB file can ask for far more; decoding one such frame took 450 MB (measured). */
  pixels: 7680 * 4320,
  side: 8192,
  /** Smaller pictures than this leave nothing to make a size from. */
  shortestSide: 32,
  framesPerSecond: 240,
  streams: 64,
  /** Whole answer of ffprobe, bytes: thousands of streams or tags would fill memory otherwise. */
  probeBytes: 8 * 2 ** 20,
  probeMs: 30_000,
  /** No new picture for this long means that it hangs; SIGTERM is ignored in that state (measured), so SIGKILL follows. */
  stallMs: 120_000,
} as const

/** Options before every `-i`: what may be opened, and how large a picture may be. */
export function inputGuard(): string[] {
  return [
    ...['-protocol_whitelist', 'file'],
    ...['-format_whitelist', takenFormats.join(',')],
    ...['-codec_whitelist', takenDecoders.join(',')],
    ...['-max_pixels', String(limits.pixels)],
  ]
}
