import { describe, expect, it } from 'vitest'
import {
  urgencyOf,
  usefulSentence,
  usefulUntil,
  usefulWords,
  type SeasonWindow,
  type Useful,
} from '@/lib/questions/urgency-rules'

const windows: SeasonWindow[] = [
  { crop: 'wheat', stage: '2', startsOn: '2026-03-01', endsOn: '2026-04-10' },
  { crop: 'wheat', stage: '3', startsOn: '2026-04-11', endsOn: '2026-05-05' },
  { crop: 'soybean', stage: '2', startsOn: '2026-06-01', endsOn: '2026-06-20' },
  { crop: 'soybean', stage: '2', startsOn: '2026-06-05', endsOn: '2026-06-28' },
  { crop: 'soybean', stage: '9', startsOn: '2026-09-10', endsOn: '2026-10-02' },
]

describe('how long an answer is of use', () => {
  const at = (today: string) => usefulUntil({ crop: 'soybean', stage: '2' }, windows, today)

  it('counts the days to the end of the stage, of several fields the one that lasts longest', () => {
    expect(at('2026-06-24')).toEqual({ kind: 'now', days: 4, until: '2026-06-28' })
    expect(at('2026-06-28')).toEqual({ kind: 'now', days: 0, until: '2026-06-28' })
  })

  it('is ahead while the stage has not begun in any field', () => {
    expect(at('2026-05-31')).toEqual({ kind: 'ahead', days: 28, until: '2026-06-28' })
    expect(at('2026-06-01').kind).toBe('now')
  })

  it('keeps to this season while the next one is already set', () => {
    const both = [...windows, { crop: 'soybean', stage: '2', startsOn: '2027-06-01', endsOn: '2027-06-20' } as const]
    expect(usefulUntil({ crop: 'soybean', stage: '2' }, both, '2026-06-24')).toMatchObject({ until: '2026-06-28' })
    expect(usefulUntil({ crop: 'soybean', stage: '2' }, both, '2026-07-01')).toMatchObject({
      kind: 'ahead',
      until: '2027-06-20',
    })
  })

  it('comes again a year later once the stage is over', () => {
    expect(at('2026-06-29')).toEqual({ kind: 'over', days: 364, until: '2027-06-28' })
    expect(at('2028-01-01')).toEqual({ kind: 'over', days: 178, until: '2028-06-27' })
  })

  it('asks only the crop that was named, and every crop when none was', () => {
    expect(usefulUntil({ crop: 'wheat', stage: '2' }, windows, '2026-06-24').kind).toBe('over')
    expect(usefulUntil({ crop: null, stage: '2' }, windows, '2026-06-24')).toMatchObject({ kind: 'now', days: 4 })
  })

  it('is unknown without a stage or without dates for it', () => {
    expect(usefulUntil({ crop: 'wheat', stage: null }, windows, '2026-06-24')).toEqual({ kind: 'unknown' })
    expect(usefulUntil({ crop: 'rice', stage: '2' }, windows, '2026-06-24')).toEqual({ kind: 'unknown' })
  })

  const said: [Useful, string, string][] = [
    [{ kind: 'now', days: 4, until: '2026-06-28' }, '4 days', 'Useful for 4 more days'],
    [{ kind: 'now', days: 1, until: '2026-06-28' }, '1 day', 'Useful for 1 more day'],
    [{ kind: 'now', days: 0, until: '2026-06-28' }, 'last day', 'Useful until today'],
    [{ kind: 'ahead', days: 60, until: '2026-10-02' }, '60 days', 'Useful for 60 more days'],
    [{ kind: 'ahead', days: 61, until: '2026-10-02' }, 'until October', 'Useful until October'],
    [{ kind: 'over', days: 280, until: '2027-04-10' }, 'next April', 'Useful again next April'],
    [{ kind: 'unknown' }, 'any time', 'Useful at any time'],
  ]
  it.each(said)('says %j as “%s” in the table and “%s” to the viewer', (useful, short, sentence) => {
    expect(usefulWords(useful)).toBe(short)
    expect(usefulSentence(useful)).toBe(sentence)
  })
})

describe('the order of the queue', () => {
  // [days left, asking, days waited, urgency]: (asking + weeks, at most 8) × (1 + 14 / (days left + 7)), worked by hand.
  const worked: [number | null, number, number, number][] = [
    [0, 1, 0, 3],
    [7, 1, 0, 2],
    [21, 1, 0, 1.5],
    [21, 1, 14, 4.5],
    [7, 2, 56, 20],
    [7, 2, 700, 20],
    [-3, 1, 0, 3],
    [7, 1, -5, 2],
    [90, 97, 0, 97 * (1 + 14 / 97)],
    [null, 97, 0, 97 * (1 + 14 / 97)],
  ]
  it.each(worked)('%s days left, %s asking, %s days waited is %s', (daysLeft, asking, waitedDays, urgency) => {
    expect(urgencyOf({ daysLeft, asking, waitedDays })).toBeCloseTo(urgency, 10)
  })

  it('puts a few whose stage ends first before a few more who have a season', () => {
    const soon = urgencyOf({ daysLeft: 4, asking: 8, waitedDays: 3 })
    const later = urgencyOf({ daysLeft: 270, asking: 11, waitedDays: 3 })
    expect(soon).toBeGreaterThan(later)
  })

  it('lets a question that was forgotten for weeks rise above a fresh one', () => {
    const forgotten = urgencyOf({ daysLeft: 20, asking: 1, waitedDays: 42 })
    const fresh = urgencyOf({ daysLeft: 20, asking: 4, waitedDays: 0 })
    expect(forgotten).toBeGreaterThan(fresh)
  })
})
