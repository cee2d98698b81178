import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseTime, writeTime } from '@/lib/times/parse'

describe('a written time', () => {
  it.each([
    ['75', 75],
    ['1:15', 75],
    ['1:15.5', 75.5],
    ['1:15,5', 75.5],
    ['1:02:03', 3723],
    [' 0:00.040 ', 0.04],
    ['90:00', 5400],
  ])('%s is %d seconds', (written, seconds) => expect(parseTime(written)).toBe(seconds))

  it.each(['', 'abc', '1:60', '1:2:3:4', '-1', '1:', ':30', '1:15.5555'])('%j is none', (written) =>
    expect(parseTime(written)).toBeNull(),
  )

  it('comes back to the tenth as it was written', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 400_000 }), (tenths) => {
        expect(parseTime(writeTime(tenths / 10))).toBeCloseTo(tenths / 10, 5)
      }),
    )
  })
})
