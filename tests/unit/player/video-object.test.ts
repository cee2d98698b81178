import { describe, expect, it } from 'vitest'
import { openAtOf } from '@/components/player/open-at'
import { videoObject } from '@/components/player/video-object'
import type { EpisodeView } from '@/lib/episodes/views'

const episode: EpisodeView = {
  id: 'e1',
  channel: { slug: 'alder-fork', name: 'Alder Fork Farm', timeZone: 'America/Chicago' },
  number: 9,
  slug: 'stand',
  title: 'Is it worth keeping?',
  summary: null,
  season: '2026',
  filmedOn: null,
  state: 'published',
  publishAt: null,
  publishedAt: '2026-03-20T12:00:00.000Z',
  duration: 192,
  url: '/channels/alder-fork/episodes/stand',
  language: 'en',
  edition: 1,
  cautionsConfirmed: true,
  footage: null,
  film: {
    hls: '/media/films/f/master.m3u8',
    plain: '/media/films/f/plain.mp4',
    poster: '/media/films/f/poster.jpg',
    sizes: [],
  },
  chapters: [
    { start: 0, end: 62.5, title: 'Why we count', topics: [], stage: null },
    { start: 62.5, end: 192, title: 'The hoop', topics: [], stage: '2' },
  ],
  captions: [],
  readings: [],
  corrections: [],
  questions: [],
  answers: [],
}
const described = (more: Partial<EpisodeView> = {}) => videoObject({ ...episode, ...more }, [], 'https://farm.example')

describe('an episode for search engines (schema.org VideoObject and Clip)', () => {
  it('has a name, a picture, a date with its zone and a length', () => {
    expect(described()).toMatchObject({
      '@type': 'VideoObject',
      name: 'Is it worth keeping?',
      thumbnailUrl: ['https://farm.example/media/films/f/poster.jpg'],
      uploadDate: '2026-03-20T12:00:00.000Z',
      duration: 'PT3M12S',
      description: 'Why we count, The hoop. Episode 9 of Alder Fork Farm.',
    })
  })

  it('has a clip per chapter that opens at its second', () => {
    expect(described()?.hasPart[1]).toEqual({
      '@type': 'Clip',
      name: 'The hoop',
      startOffset: 62,
      endOffset: 192,
      url: 'https://farm.example/channels/alder-fork/episodes/stand?t=62',
    })
  })

  it('says nothing of what the public cannot watch', () => {
    expect(described({ state: 'draft' })).toBeNull()
    expect(described({ state: 'withdrawn' })).toBeNull()
    expect(described({ film: null })).toBeNull()
  })
})

describe('the second of an address', () => {
  it.each([
    ['125', 125],
    ['62.5', 62.5],
    ['0', 0],
    [['9', '10'], 9],
    ['', null],
    [undefined, null],
    ['-5', null],
    ['1e9', null],
    ['12abc', null],
    ['2:05', null],
  ])('%j is %j', (t, at) => expect(openAtOf(t)).toBe(at))
})
