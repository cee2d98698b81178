import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { chapterAt, longPauseSeconds, paragraphsOf, sentenceAt, sentencesIn, type CueText } from '@/lib/captions/rules'

const cue = (start: number, end: number, text: string, more: Partial<CueText> = {}): CueText => ({
  start,
  end,
  text,
  speaker: null,
  terms: [],
  ...more,
})

const texts = (cues: CueText[], chapters: { start: number; end: number }[] = []) =>
  paragraphsOf(cues, chapters).map((passage) =>
    passage.paragraphs.map((paragraph) => paragraph.sentences.map((sentence) => sentence.text)),
  )

describe('setting cues as running text', () => {
  it('joins a sentence over the border between two cues', () => {
    expect(texts([cue(0, 2, 'Walk in well past the'), cue(2, 4, 'headland. Toss the hoop.')])).toEqual([
      [['Walk in well past the headland.', 'Toss the hoop.']],
    ])
  })

  it('starts a joined sentence where its first cue starts and ends it inside the second', () => {
    const [first, second] = sentencesIn(paragraphsOf([cue(10, 12, 'Walk in'), cue(12, 16, 'far. Stop.')], []))
    expect(first).toMatchObject({ start: 10, text: 'Walk in far.' })
    expect(first?.end).toBeCloseTo(12 + 4 * (4 / 10), 3)
    expect(second?.end).toBe(16)
  })

  it('reads a line break inside a cue as a space', () => {
    expect(texts([cue(0, 2, 'Count where\nit lands.')])).toEqual([[['Count where it lands.']]])
  })

  it('breaks at a chapter and names the chapter', () => {
    const chapters = [
      { start: 0, end: 10 },
      { start: 10, end: 20 },
    ]
    const passages = paragraphsOf([cue(1, 3, 'One.'), cue(9.8, 13, 'Two.')], chapters)
    expect(passages.map((passage) => passage.chapter)).toEqual([0, 1])
  })

  it('keeps words before the first chapter and in a gap between chapters', () => {
    const chapters = [{ start: 10, end: 20 }]
    const passages = paragraphsOf([cue(1, 3, 'Before.'), cue(12, 14, 'Within.'), cue(25, 27, 'After.')], chapters)
    expect(passages.map((passage) => passage.chapter)).toEqual([null, 0, null])
  })

  it('breaks at a long pause after a finished sentence', () => {
    const later = 3 + longPauseSeconds
    expect(texts([cue(0, 3, 'One.'), cue(later, later + 1, 'Two.')])).toEqual([[['One.'], ['Two.']]])
  })

  it('does not break at the same pause in the middle of a sentence', () => {
    const later = 3 + longPauseSeconds
    expect(texts([cue(0, 3, 'One plant is'), cue(later, later + 1, 'one crown.')])).toEqual([
      [['One plant is one crown.']],
    ])
  })

  it('breaks where another person speaks', () => {
    const cues = [cue(0, 2, 'How deep?', { speaker: 'June' }), cue(2, 4, 'An inch.', { speaker: 'Nell' })]
    expect(paragraphsOf(cues, [])[0]?.paragraphs.map((paragraph) => paragraph.speaker)).toEqual(['June', 'Nell'])
  })

  it('opens a new paragraph once one is full, and only between sentences', () => {
    const cues = Array.from({ length: 12 }, (_, at) =>
      cue(at * 4, at * 4 + 4, 'Do ten of these on a zigzag and keep the bad ones in.'),
    )
    const paragraphs = paragraphsOf(cues, [])[0]?.paragraphs ?? []
    expect(paragraphs.length).toBeGreaterThan(1)
    expect(paragraphs.every((paragraph) => paragraph.sentences.every((sentence) => sentence.text.endsWith('.')))).toBe(
      true,
    )
  })

  it.each([
    ['Dr. Castellan says 31.5 °F at 7 a.m. is close.', 1],
    ['It was 2.5 in. deep. Dry below.', 2],
    ['Is it alive? It is!', 2],
    ['Keep the bad ones in. Then add up.', 2],
    ['He said “Leave it.” Then we left.', 2],
    ['Wait … then count.', 1],
    ['¿Está viva? Sí.', 2],
  ])('cuts %j into %i', (text, count) => {
    expect(sentencesIn(paragraphsOf([cue(0, 5, text)], []))).toHaveLength(count)
  })

  it('moves a term to its place in the sentence', () => {
    const text = 'Stop. A plant is one crown.'
    const from = text.indexOf('crown')
    const cues = [cue(0, 2, 'Before that,'), cue(2, 4, text, { terms: [{ from, to: from + 5, slug: 'crown' }] })]
    const sentence = sentencesIn(paragraphsOf(cues, [])).at(-1)
    const term = sentence?.terms[0]
    expect(sentence?.text.slice(term?.from, term?.to)).toBe('crown')
  })

  it('drops empty cues and answers nothing with nothing', () => {
    expect(paragraphsOf([cue(0, 2, '  \n ')], [])).toEqual([])
    expect(paragraphsOf([], [{ start: 0, end: 5 }])).toEqual([])
  })

  it('loses and reorders no word, whatever the cues', () => {
    const words = fc.string({ unit: fc.constantFrom('a', 'B', '.', ' ', '?', '\n', 'é'), maxLength: 30 })
    fc.assert(
      fc.property(
        fc.array(words, { maxLength: 12 }),
        fc.array(fc.integer({ min: 1, max: 60 }), { maxLength: 4 }),
        (said, cuts) => {
          const cues = said.map((text, at) => cue(at * 5, at * 5 + 4, text))
          const starts = [...new Set(cuts)].sort((a, b) => a - b)
          const chapters = starts.map((start, at) => ({ start, end: starts[at + 1] ?? 80 }))
          const sentences = sentencesIn(paragraphsOf(cues, chapters))
          const plain = (text: string) => text.replace(/\s/g, '')
          expect(plain(sentences.map((sentence) => sentence.text).join(''))).toBe(plain(said.join('')))
          expect(sentences.every((sentence) => sentence.start <= sentence.end)).toBe(true)
          expect(sentences.every((sentence, at) => at === 0 || sentence.start >= (sentences[at - 1]?.start ?? 0))).toBe(
            true,
          )
        },
      ),
    )
  })
})

describe('what is spoken at a second', () => {
  const sentences = sentencesIn(paragraphsOf([cue(5, 8, 'One.'), cue(20, 22, 'Two.')], []))

  it('is nothing before the first word', () => expect(sentenceAt(sentences, 4.9)).toBe(-1))
  it('is the sentence from its first to its last second', () => expect(sentenceAt(sentences, 6)).toBe(0))
  it('stays through a breath', () => expect(sentenceAt(sentences, 9)).toBe(0))
  it('is nothing in a long silence', () => expect(sentenceAt(sentences, 15)).toBe(-1))
  it('is the next one at the very second it starts', () => expect(sentenceAt(sentences, 20)).toBe(1))
})

describe('the chapter at a second', () => {
  const chapters = [
    { start: 0, end: 10 },
    { start: 12, end: 20 },
  ]
  it.each([
    [0, 0],
    [9.99, 0],
    [10, null],
    [12, 1],
    [20, null],
  ])('at %f is %s', (second, chapter) => expect(chapterAt(chapters, second)).toBe(chapter))
})
