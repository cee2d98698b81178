import { describe, expect, it } from 'vitest'
import {
  episodeDocuments,
  type EpisodeFacts,
  explainerDocument,
  markdownWords,
  questionDocument,
  termDocument,
} from '@/lib/search/document-rules'
import { answersAll, fitsNarrowing } from '@/lib/search/plain-rules'

const cue = (start: number, end: number, text: string) => ({ start, end, text, speaker: null, terms: [] })

const facts: EpisodeFacts = {
  id: 'e1',
  title: 'Worth keeping?',
  summary: null,
  number: 9,
  channel: { slug: 'alder', name: 'Alder Fork Farm' },
  season: '2026',
  publishedAt: new Date('2026-03-20T10:00:00Z'),
  chapters: [
    { id: 'c1', title: 'Why we count', start: 10, end: 60, codes: ['wheat-21'] },
    { id: 'c2', title: 'Silent work', start: 60, end: 90, codes: ['job-drilling'] },
  ],
  cues: [cue(1, 3, 'Good morning.'), cue(11, 14, 'Three nights of frost'), cue(14, 17, 'on wheat. Count first.')],
}

describe('the documents of an episode', () => {
  const documents = episodeDocuments(facts)
  const byId = (id: string) => documents.find((document) => document.id === id)

  it('are what is said before the first chapter, each chapter, and the episode itself', () => {
    expect(documents.map(({ id }) => id)).toEqual(['passage-e1', 'passage-c1', 'passage-c2', 'episode-e1'])
    expect(new Set(documents.map(({ source }) => source))).toEqual(new Set(['episode-e1']))
  })

  it('hold whole sentences with the second of each, though captions break them', () => {
    expect(byId('passage-c1')).toMatchObject({
      spoken: ['Three nights of frost on wheat.', 'Count first.'],
      end: 60,
      stages: ['wheat-21', 'wheat-2'],
      season: '2026',
      channel: 'alder',
    })
    expect(byId('passage-c1')?.starts[0]).toBe(11)
    expect(byId('passage-c1')?.starts[1]).toBeGreaterThan(14)
  })

  it('open a chapter without a word at its beginning', () => {
    expect(byId('passage-c2')).toMatchObject({ spoken: [], starts: [60], jobs: ['job-drilling'] })
  })

  it('file the episode under all its chapters', () => {
    expect(byId('episode-e1')).toMatchObject({ stages: ['wheat-21', 'wheat-2'], jobs: ['job-drilling'] })
  })

  it('cut speech without full stops, so that a result still opens near its words', () => {
    const rambling = Array.from({ length: 40 }, (_, n) => cue(n * 2, n * 2 + 2, 'and then we go on'))
    const [chapter] = episodeDocuments({
      ...facts,
      chapters: [{ id: 'c', title: 'All', start: 0, end: 80, codes: [] }],
      cues: rambling,
    })
    expect(chapter?.spoken.length).toBeGreaterThan(5)
    expect(Math.max(...(chapter?.spoken.map((text) => text.split(' ').length) ?? []))).toBeLessThanOrEqual(30)
    expect(chapter?.starts).toEqual([...(chapter?.starts ?? [])].sort((a, b) => a - b))
  })
})

it('a question is filed under its crop even without a stage', () => {
  const question = {
    id: 'q',
    title: 'Why?',
    body: 'Because.',
    answer: null,
    channel: 'alder',
    season: null,
    askedAt: new Date(0),
  }
  expect(questionDocument({ ...question, crop: 'maize', stage: null })).toMatchObject({ crops: ['maize'], stages: [] })
  expect(questionDocument({ ...question, crop: null, stage: 'rice-21' })).toMatchObject({
    crops: ['rice'],
    stageKeys: ['2'],
  })
})

it('markdown is searched as it is read', () => {
  const body =
    '## Why\n\n- Add **each** [11.24\\_a \\[b\\]](#claim-x) to the [sum](https://x.example)\n1. `Then` _stop_'
  expect(explainerDocument({ id: 'x', title: 'T', summary: 'S', body }).text).toBe(
    'S Why Add each 11.24_a [b] to the sum Then stop',
  )
  expect(markdownWords('a * b')).toBe('a  b')
})

describe('the plain search', () => {
  const term = termDocument({
    id: 't',
    label: 'Crown',
    definition: 'The short stem.',
    names: ['corona'],
    crops: ['wheat'],
  })

  it('wants every word, as typed or as a beginning, anywhere in the document', () => {
    expect(answersAll(term, ['crow', 'stem'])).toBe(true)
    expect(answersAll(term, ['corona'])).toBe(true)
    expect(answersAll(term, ['crown', 'auger'])).toBe(false)
    expect(answersAll(term, [])).toBe(true)
  })

  it('narrows as the index does', () => {
    expect(fitsNarrowing(term, { kind: 'term', crop: 'wheat' })).toBe(true)
    expect(fitsNarrowing(term, { channel: 'alder' })).toBe(false)
    const [, chapter] = episodeDocuments(facts)
    for (const stage of ['wheat-21', 'wheat-2', '2']) expect(chapter && fitsNarrowing(chapter, { stage })).toBe(true)
    expect(chapter && fitsNarrowing(chapter, { stage: 'rice-2' })).toBe(false)
  })
})
