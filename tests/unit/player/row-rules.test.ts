import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  announcedPlace,
  lanesOf,
  pinSize,
  pinsOf,
  placeWords,
  readingParts,
  rowShare,
  turningPin,
} from '@/components/player/row-rules'

const chapters = [
  { start: 0, end: 160, title: 'Why we count now', stage: null },
  { start: 160, end: 724, title: 'Throwing the hoop', stage: '2' as const },
]

const question = (
  id: string,
  at: number | null,
  followUp: { number: number; url: string; start: number } | null = null,
) => ({
  id,
  title: `Question ${id}?`,
  state: followUp ? 'answered' : 'queued',
  asking: 1,
  at,
  url: `/questions/${id}`,
  followUp,
})

describe('the row in words', () => {
  it('says the place, the length and the chapter', () => {
    expect(placeWords(192, 724, chapters)).toBe('3 minutes 12 seconds of 12 minutes 4 seconds, Throwing the hoop')
  })

  it('says the place alone where there is no chapter', () => {
    expect(placeWords(5, 724, [])).toBe('5 seconds of 12 minutes 4 seconds')
  })

  it('never places anything outside itself', () => {
    expect(rowShare(900, 724)).toBe('100%')
    expect(rowShare(0, 0)).toBe('0%')
  })
})

describe('a reading', () => {
  it.each([
    [31, '°F', 'soil at crown depth', '31\u00a0°F', 'soil at crown depth'],
    [827640, 'per acre', 'plants', '827,640', 'plants per acre'],
    [2.5, 'inches', 'depth wetted', '2.5', 'inches, depth wetted'],
  ])('of %d %s of %s', (value, unit, quantity, figure, words) => {
    expect(readingParts({ at: 0, value, unit, quantity, note: null })).toEqual({ figure, words })
  })
})

describe('pins', () => {
  const pins = pinsOf({
    readings: [{ at: 188, quantity: 'soil at crown depth', value: 31, unit: '°F', note: null }],
    questions: [
      question('b', 200),
      question('a', 120, { number: 11, url: '/e/11?t=125', start: 125 }),
      question('c', null),
    ],
    corrections: [{ id: 'x', at: 300, said: 'ten', right: 'twelve', on: '2026-04-01' }],
  })

  it('stand in the order of the film, and a question about the whole episode has none', () => {
    expect(pins.map((pin) => pin.kind)).toEqual(['answered', 'reading', 'waiting', 'correction'])
  })

  it('have names that say what they are, when and how they stand', () => {
    expect(pins.map((pin) => pin.name)).toEqual([
      'Question at 2:00: Question a? Answered in episode 11, 2:05',
      'Reading at 3:08: 31\u00a0°F soil at crown depth',
      'Question at 3:20: Question b? Waiting for an answer',
      'Correction at 5:00: twelve',
    ])
  })

  it('turn to the follow-up that was passed last in the chapter, else to its first', () => {
    const answered = pinsOf({
      readings: [],
      corrections: [],
      questions: [50, 100].map((at) => question(`q${at}`, at, { number: 11, url: '/e', start: 1 })),
    })
    expect(turningPin(answered, chapters[0], 60)?.at).toBe(50)
    expect(turningPin(answered, chapters[0], 10)?.at).toBe(50)
    expect(turningPin(answered, chapters[0], 150)?.at).toBe(100)
    expect(turningPin(answered, chapters[1], 200)).toBeNull()
  })

  it('never cover one another: two in a lane are a target apart (WCAG 2.5.8)', () => {
    const times = fc.array(fc.integer({ min: 0, max: 600 }), { maxLength: 40 })
    fc.assert(
      fc.property(times, fc.integer({ min: 200, max: 1200 }), (at, width) => {
        const sorted = [...at].sort((a, b) => a - b).map((second) => ({ at: second }))
        const placed = lanesOf(sorted, 600, width).map((lane, index) => ({
          lane,
          x: ((sorted[index]?.at ?? 0) / 600) * width,
        }))
        for (const [index, pin] of placed.entries()) {
          const next = placed.slice(index + 1).find((other) => other.lane === pin.lane)
          if (next) expect(next.x - pin.x).toBeGreaterThanOrEqual(pinSize)
        }
      }),
    )
  })
})

describe('a place as it is announced', () => {
  const short = [
    { start: 0, end: 13.053, title: 'One', stage: null },
    { start: 13.053, end: 60, title: 'Two', stage: null },
  ]

  it('is a whole second, but never one of the chapter before', () => {
    expect([0.4, 13.02, 13.053, 13.9, 14.2].map((at) => announcedPlace(at, short))).toEqual([0, 13, 13.053, 13.053, 14])
  })
})
