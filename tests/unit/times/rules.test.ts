import { describe, expect, it } from 'vitest'
import { isoDuration, lengthWords, spokenTime, timeCode } from '@/lib/times/rules'

describe('a position in an episode', () => {
  it('stands as m:ss, from an hour on as h:mm:ss', () => {
    expect([0, 9, 192, 3599, 3600, 3792].map(timeCode)).toEqual(['0:00', '0:09', '3:12', '59:59', '1:00:00', '1:03:12'])
  })

  it('is cut, never rounded up: a link must not open after the words it points at', () => {
    expect(timeCode(59.999)).toBe('0:59')
    expect(spokenTime(59.999)).toBe('59 seconds')
  })

  it('is never negative and never NaN on screen', () => {
    expect(timeCode(-3)).toBe('0:00')
    expect(timeCode(Number.NaN)).toBe('0:00')
  })

  it('is spoken with its units, in the singular where there is one', () => {
    expect(spokenTime(61)).toBe('1 minute 1 second')
    expect(spokenTime(7325)).toBe('2 hours 2 minutes 5 seconds')
    expect(spokenTime(0)).toBe('0 seconds')
  })

  it('is an ISO 8601 duration for machines (ISO 8601-1:2019, 5.5.2.2)', () => {
    expect([0, 60, 192, 3600, 3661].map(isoDuration)).toEqual(['PT0S', 'PT1M', 'PT3M12S', 'PT1H', 'PT1H1M1S'])
  })
})

describe('a length', () => {
  it('is said with its unit, and never as 60 of the smaller one', () => {
    expect([48.4, 89, 90, 724, 3599, 3600, 3900].map(lengthWords)).toEqual([
      '48 s',
      '89 s',
      '2 min',
      '12 min',
      '1 h',
      '1 h',
      '1 h 5 min',
    ])
  })
})
