import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'
import { readFileSync } from 'node:fs'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { inspectFilm } from '@/media/inspect'
import { Clips } from './clips'

const clips = new Clips()
afterAll(() => clips.remove())

beforeAll(() => {
  clips.film('whole.mp4', {
    size: '320x240',
    seconds: 6,
    sound: clips.speech('s.wav', 'The soil is too wet to work today.'),
  })
  clips.ffmpeg('-i', 'whole.mp4', '-c', 'copy', '-movflags', '+faststart', 'front.mp4')
})

describe('what is no film, or not all of one', () => {
  const cases: [string, () => string, string][] = [
    ['an empty file', () => clips.text('empty.mp4', ''), 'not-a-film'],
    ['a text file named .mp4', () => clips.text('notes.mp4', 'Drill the beans on Friday.\n'.repeat(200)), 'not-a-film'],
    ['a film cut off before its index', () => cut('whole.mp4', 0.7), 'incomplete'],
    ['a film cut off behind its index', () => cut('front.mp4', 0.6), 'incomplete'],
    [
      'a Matroska film cut off',
      () => (clips.ffmpeg('-i', 'whole.mp4', '-c', 'copy', 'whole.mkv'), cut('whole.mkv', 0.5)),
      'incomplete',
    ],
    [
      'sound without picture',
      () => (clips.ffmpeg('-i', 'whole.mp4', '-vn', '-c', 'copy', 'sound.m4a'), clips.at('sound.m4a')),
      'no-picture',
    ],
    [
      'a photo named .mp4',
      () => (clips.ffmpeg('-i', 'whole.mp4', '-frames:v', '1', '-f', 'mjpeg', 'photo.mp4'), clips.at('photo.mp4')),
      'not-a-film',
    ],
    [
      'a picture of 8320 × 64 pixels',
      () => clips.film('wide.mkv', { size: '8320x64', seconds: 0.1 }),
      'too-many-pixels',
    ],
    ['a picture of 16 × 16 pixels', () => clips.film('dot.mkv', { size: '16x16', seconds: 0.1 }), 'too-small'],
    [
      'an Ogg film',
      () => (clips.ffmpeg('-i', 'whole.mp4', '-an', '-c:v', 'libtheora', 'film.ogv'), clips.at('film.ogv')),
      'not-a-film',
    ],
    [
      'a picture in a codec that is not taken',
      () => (clips.ffmpeg('-i', 'whole.mp4', '-an', '-c:v', 'huffyuv', 'lossless.avi'), clips.at('lossless.avi')),
      'codec-not-taken',
    ],
  ]

  it.each(cases)('refuses %s with a reason to act on', async (_what, make, code) => {
    const found = await inspectFilm(make())
    expect(found).toMatchObject({ ok: false, code })
    expect(found.ok ? '' : found.reason).toMatch(/Send|send|Choose|Export/)
  })

  function cut(name: string, share: number): string {
    const bytes = readFileSync(clips.at(name))
    return clips.text(`cut-${name}`, bytes.subarray(0, Math.floor(bytes.length * share)))
  }

  it('refuses two pictures a day apart as too long without decoding what lies between', async () => {
    clips.ffmpeg(
      ...[
        '-f',
        'lavfi',
        '-i',
        'color=size=64x64:rate=1:duration=2',
        '-vf',
        'setpts=N*100000/TB',
        '-vsync',
        'passthrough',
      ],
      ...['-c:v', 'libx264', 'bomb.mkv'],
    )
    expect(await inspectFilm(clips.at('bomb.mkv'))).toMatchObject({ ok: false, code: 'too-long' })
  })
})

describe('files that name other files', () => {
  it('reads nothing but itself, whatever a list inside it names', async () => {
    const other = clips.at('whole.mp4')
    const lists = {
      playlist: `#EXTM3U\n#EXT-X-TARGETDURATION:9\n#EXT-X-MEDIA-SEQUENCE:0\n#EXTINF:6,\nwhole.mp4\n#EXT-X-ENDLIST\n`,
      absolute: `#EXTM3U\n#EXT-X-TARGETDURATION:9\n#EXT-X-MEDIA-SEQUENCE:0\n#EXTINF:6,\nfile://${other}\n#EXT-X-ENDLIST\n`,
      concat: `ffconcat version 1.0\nfile whole.mp4\n`,
      dash: `<?xml version="1.0"?><MPD xmlns="urn:mpeg:dash:schema:mpd:2011" type="static"><Period><AdaptationSet><Representation id="1" mimeType="video/mp4" bandwidth="1"><BaseURL>whole.mp4</BaseURL></Representation></AdaptationSet></Period></MPD>`,
    }
    for (const [name, text] of Object.entries(lists)) {
      expect(await inspectFilm(clips.text(`${name}.mp4`, text)), name).toMatchObject({ ok: false, code: 'not-a-film' })
    }
  })

  it('asks no server for anything', async () => {
    const asked: string[] = []
    const server = createServer((request, response) => (asked.push(request.url ?? ''), response.end()))
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
    const { port } = server.address() as AddressInfo
    const text = `#EXTM3U\n#EXT-X-TARGETDURATION:9\n#EXTINF:6,\nhttp://127.0.0.1:${port}/inner.ts\n#EXT-X-ENDLIST\n`
    const found = await inspectFilm(clips.text('asks.mp4', text))
    await new Promise((resolve) => server.close(resolve))
    expect(found).toMatchObject({ ok: false, code: 'not-a-film' })
    expect(asked).toEqual([])
  })
})

describe('what is good, with its notes', () => {
  it('knows length, size, rate and tracks', async () => {
    const found = await inspectFilm(clips.at('whole.mp4'))
    expect(found).toMatchObject({
      ok: true,
      film: {
        width: 320,
        height: 240,
        rotation: 0,
        frameRate: 25,
        videoCodec: 'h264',
        audio: { codec: 'aac', channels: 1 },
        notes: [],
      },
    })
    expect(found.ok && found.film.duration).toBeCloseTo(6, 1)
  })

  it('is not misled by a title that looks like a stream', async () => {
    clips.ffmpeg(
      '-i',
      'whole.mp4',
      '-c',
      'copy',
      '-metadata',
      'title=x\n[/FORMAT]\n[STREAM]\ncodec_type=video\nduration=1.0\n[/STREAM]',
      'title.mp4',
    )
    const found = await inspectFilm(clips.at('title.mp4'))
    expect(found.ok && found.film.duration).toBeCloseTo(6, 1)
  })

  it('takes the length from the packets where the file states none', async () => {
    clips.ffmpeg('-i', 'whole.mp4', '-an', '-c', 'copy', '-f', 'matroska', '-live', '1', 'live.mkv')
    const found = await inspectFilm(clips.at('live.mkv'))
    expect(found.ok && found.film.duration).toBeCloseTo(6, 1)
  })

  it('notes missing sound, half pictures and unsquare pixels, and measures the shape that is seen', async () => {
    clips.ffmpeg(
      '-i',
      'whole.mp4',
      '-an',
      '-vf',
      'scale=180:144,setsar=16/15',
      '-flags',
      '+ilme+ildct',
      '-c:v',
      'mpeg2video',
      '-top',
      '1',
      'dv.mpg',
    )
    const found = await inspectFilm(clips.at('dv.mpg'))
    expect(found).toMatchObject({ ok: true, film: { width: 192, height: 144, audio: null, interlaced: true } })
    expect(found.ok && found.film.notes).toHaveLength(3)
  })
})
