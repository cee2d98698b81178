import { describe, expect, it } from 'vitest'
import { listenOnlyAddress } from '@/components/player/listen-only'
import { dataWords, pictureOptions, pictureWords } from '@/components/player/picture-sizes'

const sizes = [
  { height: 240, bitrate: 300_000, bytes: 31_000_000 },
  { height: 480, bitrate: 800_000, bytes: 74_200_000 },
  { height: 0, bitrate: 64_000, bytes: 5_800_000 },
]

describe('picture and data', () => {
  it('offers the biggest picture first, then the sound alone, each with the data it uses', () => {
    expect(pictureOptions(sizes).map((option) => option.label)).toEqual([
      'As the line allows',
      '480, uses about 74 MB',
      '240, uses about 31 MB',
      'Sound only, uses about 6 MB',
    ])
  })

  it('names the picture on screen, also when the line decides', () => {
    expect(pictureWords('auto', 480, sizes).full).toBe('Picture: 480, uses about 74 MB')
    expect(pictureWords(240, null, sizes)).toEqual({ full: 'Picture: 240, uses about 31 MB', short: '240, 31 MB' })
    expect(pictureWords('sound', null, sizes).full).toBe('Sound only, uses about 6 MB')
  })

  it('promises no figure that it does not know', () => {
    expect(pictureWords('auto', null, sizes).full).toBe('Picture: as the line allows')
    expect(pictureWords('sound', null, []).full).toBe('Sound only')
  })

  it('counts data as a data plan does', () => {
    expect([400_000, 74_200_000, 1_250_000_000].map(dataWords)).toEqual(['under 1 MB', '74 MB', '1.3 GB'])
  })
})

describe('the sound alone, from a master playlist (RFC 8216, 4.3.4)', () => {
  const base = 'https://farm.example/media/films/f1/master.m3u8'

  it('is the variant without a picture', () => {
    const master = [
      '#EXTM3U',
      '#EXT-X-STREAM-INF:BANDWIDTH=900000,RESOLUTION=854x480,CODECS="avc1.4d401f,mp4a.40.2"',
      '480/index.m3u8',
      '#EXT-X-STREAM-INF:BANDWIDTH=70000,CODECS="mp4a.40.2"',
      'audio/index.m3u8',
    ].join('\n')
    expect(listenOnlyAddress(master, base)).toBe('https://farm.example/media/films/f1/audio/index.m3u8')
  })

  it('is else the rendition of the audio group', () => {
    const master = [
      '#EXTM3U',
      '#EXT-X-MEDIA:TYPE=AUDIO,GROUP-ID="a",NAME="English",DEFAULT=YES,URI="audio/stream.m3u8"',
      '#EXT-X-STREAM-INF:BANDWIDTH=900000,RESOLUTION=854x480,CODECS="avc1.4d401f,mp4a.40.2",AUDIO="a"',
      '480/index.m3u8',
    ].join('\r\n')
    expect(listenOnlyAddress(master, base)).toBe('https://farm.example/media/films/f1/audio/stream.m3u8')
  })

  it('is nothing where picture and sound come in one', () => {
    const master = '#EXTM3U\n#EXT-X-STREAM-INF:BANDWIDTH=900000,CODECS="avc1.4d401f,mp4a.40.2"\n480.m3u8\n'
    expect(listenOnlyAddress(master, base)).toBeNull()
  })
})
