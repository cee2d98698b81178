import { describe, expect, it } from 'vitest'
import { dateAndTime, momentOf } from '@/lib/dates/when'

describe('an hour by the farm’s clock', () => {
  // US rules, 15 U.S.C. 260a: clocks go forward at 2 a.m. on 8 March 2026 and back at 2 a.m. on 1 November 2026.
  it.each([
    ['a winter hour', '2026-01-15T06:00', '2026-01-15T12:00:00.000Z'],
    ['a summer hour', '2026-07-15T06:00', '2026-07-15T11:00:00.000Z'],
    ['the hour before the gap', '2026-03-08T01:30', '2026-03-08T07:30:00.000Z'],
    ['an hour inside the gap, moved on', '2026-03-08T02:30', '2026-03-08T08:30:00.000Z'],
    ['an hour that comes twice, the first', '2026-11-01T01:30', '2026-11-01T06:30:00.000Z'],
  ])('%s', (_, clock, moment) => expect(momentOf(clock, 'America/Chicago').toISOString()).toBe(moment))

  it('is written as the farm says it', () => {
    expect(dateAndTime('2026-04-03T11:00:00Z', 'America/Chicago')).toBe('3 April 2026, 06:00')
  })
})
