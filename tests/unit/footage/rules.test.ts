import { describe, expect, it } from 'vitest'
import {
  aboutWords,
  cleanFilename,
  cleanFiletype,
  paceOf,
  secondsLeft,
  sizeWords,
  stepWords,
} from '@/lib/footage/rules'
import { parseUploadMetadata } from '@/lib/footage/schema'

const base64 = (text: string) => Buffer.from(text).toString('base64')

describe('the name a film came with', () => {
  it.each([
    ['Kürbis.mp4', 'Kürbis.mp4'],
    ['a\u202Egnp.mp4', 'agnp.mp4'],
    ['line\r\nbreak\0.mov', 'linebreak.mov'],
    ['  ', 'film'],
    ['../../x', '../../x'],
  ])('keeps %j as words', (given, kept) => expect(cleanFilename(given)).toBe(kept))

  it('is one Unicode form, and not longer than 200 letters', () => {
    expect(cleanFilename('e\u0301.mp4')).toBe('é.mp4')
    expect([...cleanFilename('🌾'.repeat(300))]).toHaveLength(200)
  })

  it('comes with a type only where that is a kind of film', () => {
    expect(cleanFiletype('Video/QuickTime')).toBe('video/quicktime')
    expect(cleanFiletype('text/html')).toBeNull()
    expect(cleanFiletype(undefined)).toBeNull()
  })
})

describe('how long a film still takes', () => {
  it('is told from the pace of the last seconds, once there is one', () => {
    expect(paceOf([])).toBeNull()
    expect(
      paceOf([
        [0, 0],
        [400, 4000],
      ]),
    ).toBeNull()
    expect(
      paceOf([
        [1000, 500],
        [2000, 900],
        [3000, 2500],
      ]),
    ).toBe(1000)
    expect(secondsLeft(400, 1000, 100)).toBe(6)
    expect(secondsLeft(400, 1000, 0)).toBeNull()
  })

  it.each([
    [10, 'less than a minute'],
    [70, 'about 1 minute'],
    [600, 'about 10 minutes'],
    [2 * 3600, 'about 2 hours'],
    [9000, 'about 2.5 hours'],
  ])('%i s is %s', (seconds, words) => expect(aboutWords(seconds)).toBe(words))

  it.each([
    [0, '1 kB'],
    [820_000, '820 kB'],
    [3_400_000, '3 MB'],
    [12_340_000_000, '12.3 GB'],
  ])('%i bytes is %s', (bytes, words) => expect(sizeWords(bytes)).toBe(words))

  it('names the step, and the wait before the first', () => {
    expect(stepWords('first-size')).toMatch(/smallest size/)
    expect(stepWords(null)).toMatch(/turn/)
  })
})

describe('Upload-Metadata (tus 1.0.0, creation)', () => {
  const episodeId = '7f9c24e8-3b1d-4d5a-9d0c-0f6a3b1d4d5a'

  it('is pairs of a key and base64, some without a value', () => {
    const header = `episodeId ${base64(episodeId)}, filename ${base64('Kürbis, spät.mp4')},is_confidential`
    expect(parseUploadMetadata(header)).toEqual({ episodeId, filename: 'Kürbis, spät.mp4' })
  })

  it.each([
    null,
    '',
    `episodeId ${base64('x')}`,
    `episodeId ${base64(episodeId)},episodeId ${base64(episodeId)}`,
    'episodeId a b',
    'episodeId =A==',
  ])('refuses %j', (header) => expect(() => parseUploadMetadata(header)).toThrow())
})
