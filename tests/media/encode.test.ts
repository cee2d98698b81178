import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs'
import { join } from 'node:path'
import * as HLS from 'hls-parser'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { encodeFilm, readEncoded, type EncodedFilm } from '@/media/encode'
import { inspectFilm, type Film } from '@/media/inspect'
import { Clips, ffprobe } from './clips'
import { firstPicture } from './segments'

const clips = new Clips()
afterAll(() => clips.remove())

async function filmOf(path: string): Promise<Film> {
  const found = await inspectFilm(path)
  if (!found.ok) throw new Error(found.reason)
  return found.film
}

const read = (folder: string, name: string) => readFileSync(join(folder, name), 'utf8')

function master(folder: string): HLS.types.MasterPlaylist {
  HLS.setOptions({ strictMode: true })
  const playlist = HLS.parse(read(folder, 'master.m3u8'))
  if (!playlist.isMasterPlaylist) throw new Error('Not a master playlist')
  return playlist as HLS.types.MasterPlaylist
}

function media(folder: string, uri: string): HLS.types.MediaPlaylist {
  HLS.setOptions({ strictMode: true })
  return HLS.parse(read(folder, uri)) as HLS.types.MediaPlaylist
}

describe('a talked-over film at 640 × 360, 29.97 pictures a second', () => {
  const folder = clips.at('film-a')
  const progress: number[] = []
  const ready: { height: number; playable: boolean }[] = []
  let film: Film
  let encoded: EncodedFilm

  beforeAll(async () => {
    const sound = clips.speech(
      'talk.wav',
      'We count plants in one square foot, nineteen of them here. The drill was set two notches too deep, so the outer rows came late. Look at the crown before you judge the stand.',
    )
    const source = clips.film('talk.mp4', { size: '640x360', rate: '30000/1001', seconds: 9.5, sound })
    film = await filmOf(source)
    encoded = await encodeFilm({
      source,
      film,
      folder,
      language: 'en',
      onProgress: (fraction) => progress.push(fraction),
      onRendition: ({ height }, working) =>
        ready.push({
          height,
          playable: existsSync(join(working, String(height), 'index.m3u8')) && existsSync(join(working, 'plain.mp4')),
        }),
    })
  })

  it('is made in sizes up to its own, smallest ready first', () => {
    expect(ready).toEqual([
      { height: 240, playable: true },
      { height: 360, playable: true },
    ])
    expect(encoded.renditions.map((rendition) => rendition.height)).toEqual([240, 360])
    expect(encoded.sound).not.toBeNull()
  })

  it('tells its progress forwards only, and is done only at the end', () => {
    expect(progress.length).toBeGreaterThan(4)
    expect(progress).toEqual([...progress].sort((a, b) => a - b))
    expect(progress.filter((fraction) => fraction === 1)).toHaveLength(1)
    expect(progress.at(-1)).toBe(1)
  })

  it('lists its sizes, sound and listen-only variant as RFC 8216 asks', () => {
    const list = master(folder)
    expect(list.independentSegments).toBe(true)
    const pictures = list.variants.filter((variant) => variant.resolution)
    expect(pictures.map((variant) => variant.resolution)).toEqual([
      { width: 640, height: 360 },
      { width: 426, height: 240 },
    ])
    const listenOnly = list.variants.filter((variant) => !variant.resolution)
    expect(listenOnly.map((variant) => variant.codecs)).toEqual(['mp4a.40.2'])
    for (const variant of pictures) {
      expect(variant.frameRate).toBeCloseTo(30000 / 1001, 2)
      expect(variant.codecs).toMatch(/^avc1\.64[0-9a-f]{4},mp4a\.40\.2$/)
      expect(variant.audio[0]).toMatchObject({ language: 'en', isDefault: true, uri: 'audio/index.m3u8' })
    }
  })

  it('declares bandwidth within a tenth of what the segments measure (RFC 8216 4.3.4.2)', () => {
    const rate = (uri: string) => {
      const list = media(folder, uri)
      const sizes = list.segments.map((segment) => ({
        bits: 8 * statSync(join(folder, uri, '..', segment.uri)).size,
        seconds: segment.duration,
      }))
      const seconds = sizes.reduce((sum, size) => sum + size.seconds, 0)
      const full = sizes.filter((size) => size.seconds >= list.targetDuration / 2)
      return {
        average: sizes.reduce((sum, size) => sum + size.bits, 0) / seconds,
        peak: Math.max(...full.map((size) => size.bits / size.seconds)),
      }
    }
    const sound = rate('audio/index.m3u8')
    for (const variant of master(folder).variants.filter((one) => one.resolution)) {
      const picture = rate(variant.uri)
      expect((variant.averageBandwidth ?? 0) / (picture.average + sound.average)).toBeCloseTo(1, 1)
      expect(variant.bandwidth / (picture.peak + sound.peak)).toBeGreaterThanOrEqual(0.999)
      expect(variant.bandwidth / (picture.peak + sound.peak)).toBeLessThan(1.1)
    }
  })

  it('begins every segment with a key picture, has none longer than the target, and leaves no gap', () => {
    for (const height of [240, 360]) {
      const list = media(folder, `${height}/index.m3u8`)
      expect(list.playlistType).toBe('VOD')
      expect(list.endlist).toBe(true)
      let total = 0
      for (const segment of list.segments) {
        expect(Math.round(segment.duration)).toBeLessThanOrEqual(list.targetDuration)
        const bytes = readFileSync(join(folder, String(height), segment.uri))
        const start = firstPicture(bytes, readFileSync(join(folder, String(height), 'init.mp4')))
        expect(start.isKey).toBe(true)
        expect(start.seconds).toBeCloseTo(total, 3)
        total += segment.duration
      }
      expect(Math.abs(total - film.duration)).toBeLessThan(0.05)
    }
  })

  it('cuts every size at the same pictures, and sound to the same length', () => {
    const cuts = (uri: string) => media(folder, uri).segments.map((segment) => segment.duration.toFixed(3))
    expect(cuts('240/index.m3u8')).toEqual(cuts('360/index.m3u8'))
    const length = (uri: string) => media(folder, uri).segments.reduce((sum, segment) => sum + segment.duration, 0)
    expect(Math.abs(length('audio/index.m3u8') - length('360/index.m3u8'))).toBeLessThan(0.05)
    expect(media(folder, 'audio/index.m3u8').segments).toHaveLength(media(folder, '360/index.m3u8').segments.length)
    expect(media(folder, 'audio/index.m3u8').targetDuration).toBe(media(folder, '360/index.m3u8').targetDuration)
  })

  it('has RESOLUTION and CODECS equal to what is in the file', () => {
    for (const variant of master(folder).variants.filter((one) => one.resolution)) {
      const { streams } = ffprobe(join(folder, variant.uri))
      expect({ width: streams[0]?.width, height: streams[0]?.height }).toEqual(variant.resolution)
      const level = Number(streams[0]?.level).toString(16).padStart(2, '0')
      expect(variant.codecs).toContain(`avc1.6400${level}`)
    }
  })

  it('comes with a plain MP4, index first, and a poster', () => {
    const { streams, format } = ffprobe(join(folder, 'plain.mp4'))
    expect(streams.map((stream) => stream.codec_name)).toEqual(['h264', 'aac'])
    expect(Number(format.duration)).toBeCloseTo(film.duration, 0)
    const [picture, sound] = streams.map((stream) => Number(stream.start_time))
    expect(Math.abs((picture ?? 1) - (sound ?? 0))).toBeLessThan(0.025)
    const bytes = readFileSync(join(folder, 'plain.mp4'))
    expect(bytes.indexOf('moov')).toBeLessThan(bytes.indexOf('mdat'))
    expect(ffprobe(join(folder, 'poster.jpg')).streams[0]).toMatchObject({
      codec_name: 'mjpeg',
      width: 640,
      height: 360,
    })
  })

  it('can be read back from its folder, and leaves nothing unfinished beside it', async () => {
    expect(await readEncoded(folder)).toEqual(encoded)
    expect(readdirSync(clips.folder).filter((name) => name.startsWith('making-'))).toEqual([])
    expect(existsSync(join(folder, 'parts'))).toBe(false)
  })
})

describe('films that are out of the ordinary', () => {
  it('shows a phone film the right way up and forgets where it was taken', async () => {
    clips.film('lying.mp4', { size: '320x180', seconds: 1.2 })
    const turn = [
      '-i',
      'lying.mp4',
      '-c',
      'copy',
      '-metadata:s:v',
      'rotate=90',
      '-metadata',
      'location=+43.4670+011.8850/',
    ]
    clips.ffmpeg(...turn, 'phone.mp4')
    const film = await filmOf(clips.at('phone.mp4'))
    expect(film).toMatchObject({ width: 180, height: 320, audio: null })
    await encodeFilm({ source: clips.at('phone.mp4'), film, folder: clips.at('phone'), language: 'en' })
    const served = ffprobe(join(clips.at('phone'), 'plain.mp4'))
    expect(Number(served.streams[0]?.height)).toBeGreaterThan(Number(served.streams[0]?.width))
    expect(served.streams[0]?.side_data_list).toBeUndefined()
    for (const name of ['plain.mp4', 'poster.jpg', '180/init.mp4', 'master.m3u8']) {
      expect(readFileSync(join(clips.at('phone'), name)).includes('43.467')).toBe(false)
    }
    const list = master(clips.at('phone'))
    expect(list.variants.every((variant) => variant.audio.length === 0 && !variant.codecs?.includes('mp4a'))).toBe(true)
    expect(list.variants.map((variant) => variant.resolution)).toContainEqual({ width: 180, height: 320 })
  })

  it('makes odd sizes and fine colour playable, in at least two sizes', async () => {
    clips.ffmpeg(
      '-f',
      'lavfi',
      '-i',
      'testsrc2=size=321x241:rate=10:duration=1',
      '-pix_fmt',
      'yuv444p',
      '-c:v',
      'libx264',
      'odd.mkv',
    )
    const film = await filmOf(clips.at('odd.mkv'))
    const encoded = await encodeFilm({ source: clips.at('odd.mkv'), film, folder: clips.at('odd'), language: 'en' })
    expect(encoded.renditions.length).toBeGreaterThanOrEqual(2)
    for (const rendition of encoded.renditions) {
      expect([rendition.pixelsWide % 2, rendition.pixelsHigh % 2]).toEqual([0, 0])
      expect(ffprobe(join(clips.at('odd'), String(rendition.height), 'index.m3u8')).streams[0]?.pix_fmt).toBe('yuv420p')
    }
  })

  it('makes a film of a single picture', async () => {
    clips.film('instant.mp4', { size: '128x96', rate: '25', seconds: 0.04 })
    const film = await filmOf(clips.at('instant.mp4'))
    const encoded = await encodeFilm({
      source: clips.at('instant.mp4'),
      film,
      folder: clips.at('instant'),
      language: 'en',
    })
    expect(encoded.durationS).toBeGreaterThan(0)
    expect(media(clips.at('instant'), `${encoded.renditions[0]?.height}/index.m3u8`).targetDuration).toBe(1)
  })
})
