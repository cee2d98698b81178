import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  addDays,
  dayAndMonth,
  dayNumber,
  dayOf,
  daysApartInYear,
  fullDay,
  monthsBetween,
  shortMonth,
  todayIn,
} from '@/lib/dates/rules'

describe('a calendar day', () => {
  it('counts from 1 January 1970', () => {
    expect(dayNumber('1970-01-01')).toBe(0)
    // Gregorian leap rule: 2000 had a 29 February, 1900 had none.
    expect(dayNumber('2000-03-01') - dayNumber('2000-02-28')).toBe(2)
    expect(dayNumber('1900-03-01') - dayNumber('1900-02-28')).toBe(1)
  })

  it('survives the way there and back, over leap years and year ends', () => {
    fc.assert(fc.property(fc.integer({ min: -20_000, max: 60_000 }), (n) => dayNumber(dayOf(n)) === n))
    expect(addDays('2024-02-28', 1)).toBe('2024-02-29')
    expect(addDays('2025-12-31', 1)).toBe('2026-01-01')
  })

  it('refuses what is no day', () => {
    for (const text of ['2026-02-30', '2026-13-01', '2026-1-1', '', 'today', '2025-02-29']) {
      expect(() => dayNumber(text), text).toThrow(RangeError)
    }
  })

  it('is a day like any other when the clocks change', () => {
    // Clocks went forward on 8 March 2026 in the United States and on 29 March in Europe.
    expect(dayNumber('2026-03-09') - dayNumber('2026-03-08')).toBe(1)
    expect(dayNumber('2026-03-30') - dayNumber('2026-03-29')).toBe(1)
  })
})

describe('today', () => {
  it('is the day of the farm, not of the server', () => {
    const late = new Date('2026-06-30T23:30:00Z')
    expect(todayIn('America/Chicago', late)).toBe('2026-06-30')
    expect(todayIn('Asia/Manila', late)).toBe('2026-07-01')
  })

  it('is right in the hour that the clocks skip and the hour that they repeat', () => {
    expect(todayIn('America/Chicago', new Date('2026-03-08T08:30:00Z'))).toBe('2026-03-08')
    expect(todayIn('America/Chicago', new Date('2026-11-01T06:30:00Z'))).toBe('2026-11-01')
  })
})

describe('months', () => {
  it('are listed by their first days over the end of a year', () => {
    expect(monthsBetween('2025-11-30', '2026-02-01')).toEqual(['2025-11-01', '2025-12-01', '2026-01-01', '2026-02-01'])
  })

  it('are one when both ends lie in it', () => {
    expect(monthsBetween('2026-05-31', '2026-05-01')).toEqual(['2026-05-01'])
  })
})

describe('days of the year', () => {
  it('are near each other across the year end', () => {
    expect(daysApartInYear('2026-12-30', '2024-01-02')).toBe(3)
    expect(daysApartInYear('2026-01-02', '2019-12-30')).toBe(3)
  })

  it('take 29 February for 1 March in other years', () => {
    expect(daysApartInYear('2026-03-01', '2024-02-29')).toBe(0)
  })
})

describe('a day in words', () => {
  it('is written day first, with the month in letters, since 3/4 means two things', () => {
    expect(shortMonth('2026-09-01')).toBe('Sep')
    expect([dayAndMonth('2026-03-18'), fullDay('2026-03-18'), shortMonth('2026-03-18')]).toEqual([
      '18 March',
      '18 March 2026',
      'Mar',
    ])
  })

  it('follows the language', () => {
    expect(dayAndMonth('2026-03-18', 'es')).toBe('18 de marzo')
  })
})
