import type { Film } from './inspect'
import type { Rung } from './ladder'

/** Mapping down a wide range of brightness costs several times the decode, so it comes after the picture is made small. */
const toneMap =
  'zscale=t=linear:npl=203,format=gbrpf32le,zscale=p=bt709,tonemap=tonemap=hable:desat=0,zscale=t=bt709:m=bt709:r=tv'

/** One decode, one branch for each size. ffmpeg has turned the picture upright before it gets here. Labels are `v0`, `v1`, … */
export function pictureGraph(film: Film, rungs: Rung[]): string {
  const head = [
    `[0:${film.videoStream}]${film.interlaced ? 'bwdif=mode=send_frame,' : ''}split=${rungs.length}`,
    ...rungs.map((_, index) => `[s${index}]`),
  ].join('')
  return [head, ...rungs.map((rung, index) => `[s${index}]${branch(film, rung)}[v${index}]`)].join(';')
}

function branch(film: Film, rung: Rung): string {
  return [
    // Filmed pace varies and may begin late; from here on pictures are evenly spaced from zero.
    `fps=fps=${rung.frameRate.num}/${rung.frameRate.den}:start_time=0`,
    `scale=w=${rung.pixelsWide}:h=${rung.pixelsHigh}:flags=bicubic`,
    ...(film.highDynamicRange ? [toneMap] : []),
    'setsar=1',
    'format=yuv420p',
  ].join(',')
}

export const soundRate = 48_000
const samplesPerPacket = 1024

/** Sound as long as the picture to within one AAC packet: silence is put behind short sound, long sound is cut. */
export function soundGraph(audio: NonNullable<Film['audio']>, durationS: number): string {
  const packets = Math.max(1, Math.floor((durationS * soundRate) / samplesPerPacket))
  return [
    `[0:${audio.stream}]aresample=${soundRate}:async=1:first_pts=0`,
    `aformat=channel_layouts=${audio.channels > 1 ? 'stereo' : 'mono'}`,
    'apad',
    `atrim=end_sample=${packets * samplesPerPacket}[sound]`,
  ].join(',')
}
