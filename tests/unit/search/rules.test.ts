import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readFilter } from '@/fakes/search/filter'
import {
  conditionsOf,
  filing,
  foldedWords,
  likeness,
  MARK_CLOSE,
  MARK_OPEN,
  nearestNames,
  normalised,
  plainText,
  quoted,
} from '@/lib/search/rules'

describe('a typed query', () => {
  it('becomes one line of composed letters without controls or marks of ours', () => {
    expect(normalised('  stand \t\n count ')).toBe('stand count')
    expect(normalised('macollaje\u0301')).toBe('macollajé')
    expect(normalised(`a${MARK_OPEN}b${MARK_CLOSE}\u0000c\ud800d`)).toBe('a b c d')
  })

  it('is cut where nobody types on', () => {
    expect(normalised('wheat '.repeat(100)).length).toBeLessThanOrEqual(200)
  })
})

it('no text can carry a mark into the index', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'binary' }), (text) => {
      expect(plainText(text)).not.toMatch(new RegExp(`[${MARK_OPEN}${MARK_CLOSE}]`, 'u'))
    }),
  )
})

it('a quoted value is one value to the reader of filters, whatever is in it', () => {
  fc.assert(
    fc.property(
      fc.oneof(fc.string(), fc.string({ unit: fc.constantFrom('"', "'", '\\', ' OR ', 'x', ')') })),
      (value) => {
        expect(readFilter(`channel = ${quoted(value)}`)).toEqual({ op: '=', attribute: 'channel', value })
      },
    ),
  )
})

describe('choices', () => {
  it('become conditions that all hold, each of its own attribute', () => {
    expect(conditionsOf({ crop: 'wheat', stage: 'wheat-2', kind: 'passage' })).toEqual([
      'kind = "passage"',
      'crops = "wheat"',
      'stages = "wheat-2"',
    ])
    expect(conditionsOf({ crop: 'wheat', kind: 'passage' }, 'crop')).toEqual(['kind = "passage"'])
  })

  it('of a bare principal stage go over all crops', () => {
    expect(conditionsOf({ stage: '2' })).toEqual(['stageKeys = "2"'])
    expect(conditionsOf({ stage: 'soil' })).toEqual(['stages = "soil"'])
  })
})

describe('filing', () => {
  it('keeps a two-digit stage under its principal stage as well, each once', () => {
    expect(filing(['wheat-21', 'wheat-22', 'job-drilling', 'subject-water'])).toEqual({
      crops: ['wheat'],
      stages: ['wheat-21', 'wheat-2', 'wheat-22'],
      stageKeys: ['2'],
      jobs: ['job-drilling'],
      subjects: ['subject-water'],
    })
  })

  it('files the seedbed under no crop, and passes over codes that nobody publishes', () => {
    expect(filing(['soil', 'rice-31', 'nonsense'])).toMatchObject({ crops: [], stages: ['soil'], stageKeys: ['soil'] })
  })
})

describe('nearness of words', () => {
  it('is whole for the same word, half-way for a slip, none for another', () => {
    expect(likeness('crown', 'crown')).toBe(1)
    expect(likeness('crown', 'crwn')).toBeGreaterThan(0.5)
    expect(likeness('crown', 'auger')).toBe(0)
    expect(likeness('', '')).toBe(1)
    expect(likeness('a', 'b')).toBe(0)
  })

  it('brings the nearest names first and nothing that does not look alike', () => {
    const known = [{ names: ['Auger'] }, { names: ['Crown', 'crowns'] }, { names: ['Crowfoot'] }]
    expect(nearestNames('corwn depth', known, 5).map(({ names }) => names[0])).toEqual(['Crown'])
    expect(nearestNames('crow', known, 5).map(({ names }) => names[0])).toEqual(['Crown', 'Crowfoot'])
    expect(nearestNames('', known, 5)).toEqual([])
  })
})

it('words are compared without case and accents', () => {
  expect(foldedWords('El Trigo está: 31 °F')).toEqual(['el', 'trigo', 'esta', '31', 'f'])
})
