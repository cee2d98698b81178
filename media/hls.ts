/** Playlists of RFC 8216, written from what the segments on disk really are. */

export type Segment = { name: string; durationS: number; bytes: number }
export type Track = { folder: string; segments: Segment[]; initBytes: number }

/** Names and lengths of the segments in a media playlist that ffmpeg wrote. Sizes are added by whoever can see the files. */
export function readSegments(playlist: string): { name: string; durationS: number }[] {
  const found: { name: string; durationS: number }[] = []
  let durationS: number | null = null
  for (const line of playlist.split('\n').map((text) => text.trim())) {
    if (line.startsWith('#EXTINF:')) durationS = Number.parseFloat(line.slice('#EXTINF:'.length))
    else if (line !== '' && !line.startsWith('#') && durationS !== null) {
      found.push({ name: line, durationS })
      durationS = null
    }
  }
  return found
}

export const lengthOf = (track: Track): number => track.segments.reduce((sum, segment) => sum + segment.durationS, 0)
export const bytesOf = (track: Track): number => track.segments.reduce((sum, segment) => sum + segment.bytes, 0)

/** The same target for every track: RFC 8216 4.3.3.1, no rounded segment may be longer. Seconds. */
export function targetDuration(tracks: Track[]): number {
  return Math.max(1, ...tracks.flatMap((track) => track.segments.map((segment) => Math.round(segment.durationS))))
}

export function mediaPlaylist(track: Track, target: number): string {
  return [
    '#EXTM3U',
    '#EXT-X-VERSION:7',
    `#EXT-X-TARGETDURATION:${target}`,
    '#EXT-X-MEDIA-SEQUENCE:0',
    '#EXT-X-PLAYLIST-TYPE:VOD',
    '#EXT-X-INDEPENDENT-SEGMENTS',
    '#EXT-X-MAP:URI="init.mp4"',
    ...track.segments.flatMap((segment) => [`#EXTINF:${segment.durationS.toFixed(6)},`, segment.name]),
    '#EXT-X-ENDLIST',
    '',
  ].join('\n')
}

/** Bits per second: mean, and the peak over runs of segments lasting 0.5 to 1.5 target durations (RFC 8216 4.3.4.2). */
export function measureRate(track: Track, target: number): { average: number; peak: number } {
  const average = (bytesOf(track) * 8) / Math.max(0.001, lengthOf(track))
  let peak = 0
  for (let from = 0; from < track.segments.length; from += 1) {
    let bytes = 0
    let seconds = 0
    for (const segment of track.segments.slice(from)) {
      bytes += segment.bytes
      seconds += segment.durationS
      if (seconds > target * 1.5) break
      if (seconds >= target * 0.5) peak = Math.max(peak, (bytes * 8) / seconds)
    }
  }
  return { average: Math.ceil(average), peak: Math.ceil(Math.max(peak, average)) }
}

export type MasterVariant = Track & { codec: string; width: number; height: number; frameRate: number }
export type MasterAudio = Track & { codec: string; channels: number; language: string }

/** Players that cannot measure yet begin with the first one listed: the middle of what a slow rural line carries. */
const firstByName = [360, 480, 240]

function firstListed(variants: MasterVariant[]): MasterVariant[] {
  const short = (variant: MasterVariant) => Math.min(variant.width, variant.height)
  const first = firstByName.map((height) => variants.find((variant) => short(variant) === height)).find(Boolean)
  return first ? [first, ...variants.filter((variant) => variant !== first)] : variants
}

/** Master playlist: every figure measured, sound as one group of its own, listen only as a variant. */
export function masterPlaylist(variants: MasterVariant[], audio: MasterAudio | null): string {
  const target = targetDuration(audio ? [...variants, audio] : variants)
  const sound = audio ? measureRate(audio, target) : { average: 0, peak: 0 }
  const lines = ['#EXTM3U', '#EXT-X-VERSION:7', '#EXT-X-INDEPENDENT-SEGMENTS', '']
  if (audio) {
    lines.push(
      `#EXT-X-MEDIA:TYPE=AUDIO,GROUP-ID="sound",NAME="As filmed",LANGUAGE="${audio.language}",DEFAULT=YES,AUTOSELECT=YES,` +
        `CHANNELS="${audio.channels}",URI="${audio.folder}/index.m3u8"`,
      '',
    )
  }
  for (const variant of firstListed(variants)) {
    const picture = measureRate(variant, target)
    lines.push(
      `#EXT-X-STREAM-INF:BANDWIDTH=${picture.peak + sound.peak},AVERAGE-BANDWIDTH=${picture.average + sound.average},` +
        `CODECS="${audio ? `${variant.codec},${audio.codec}` : variant.codec}",RESOLUTION=${variant.width}x${variant.height},` +
        `FRAME-RATE=${variant.frameRate.toFixed(3)}${audio ? ',AUDIO="sound"' : ''}`,
      `${variant.folder}/index.m3u8`,
    )
  }
  if (audio) {
    lines.push(
      `#EXT-X-STREAM-INF:BANDWIDTH=${sound.peak},AVERAGE-BANDWIDTH=${sound.average},CODECS="${audio.codec}",AUDIO="sound"`,
      `${audio.folder}/index.m3u8`,
    )
  }
  return [...lines, ''].join('\n')
}
