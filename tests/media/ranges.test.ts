import { describe, expect, it } from 'vitest'
import { answerRange, contentRange, isUnchanged } from '@/media/ranges'

const thing = { size: 1000, etag: '"rs-1"', modifiedAt: new Date('2026-03-02T10:00:00.500Z') }
const ask = (header: string | null, ifRange: string | null = null) => answerRange(header, thing, ifRange)
const part = (first: number, last: number) => ({ status: 206, ranges: [{ first, last }] })

describe('byte ranges (RFC 9110 section 14)', () => {
  it.each([
    ['bytes=0-499', part(0, 499)],
    ['bytes=500-', part(500, 999)],
    ['bytes=-500', part(500, 999)],
    ['bytes=-5000', part(0, 999)],
    ['bytes=999-999', part(999, 999)],
    ['bytes=990-4000', part(990, 999)],
    ['BYTES = 0-0', part(0, 0)],
    [
      'bytes=0-0,-1',
      {
        status: 206,
        ranges: [
          { first: 0, last: 0 },
          { first: 999, last: 999 },
        ],
      },
    ],
    ['bytes=2000-,10-19', part(10, 19)],
  ])('answers %s with a part', (header, answer) => expect(ask(header)).toEqual(answer))

  it.each(['bytes=1000-', 'bytes=5000-6000', 'bytes=-0'])('calls %s unsatisfiable', (header) => {
    expect(ask(header)).toEqual({ status: 416 })
  })

  it.each([
    null,
    'bytes=',
    'bytes=5-1',
    'bytes=a-b',
    'bytes=1-2-3',
    'lines=1-2',
    'bytes=0x1-2',
    'bytes=--5',
    'bytes=0-9,x',
  ])('takes %s as no range at all', (header) => expect(ask(header)).toEqual({ status: 200 }))

  it('sends the whole rather than many or overlapping parts', () => {
    expect(ask(`bytes=${Array.from({ length: 9 }, (_, at) => `${at * 10}-${at * 10 + 1}`).join(',')}`)).toEqual({
      status: 200,
    })
    expect(ask('bytes=0-500,400-600')).toEqual({ status: 200 })
  })

  it('finds nothing in an empty file', () => {
    expect(answerRange('bytes=0-0', { ...thing, size: 0 })).toEqual({ status: 416 })
    expect(answerRange('bytes=-1', { ...thing, size: 0 })).toEqual({ status: 416 })
  })

  it('continues only what is still the same (If-Range, 13.1.5)', () => {
    expect(ask('bytes=0-9', '"rs-1"')).toEqual(part(0, 9))
    expect(ask('bytes=0-9', '"other"')).toEqual({ status: 200 })
    expect(ask('bytes=0-9', 'W/"rs-1"')).toEqual({ status: 200 })
    expect(ask('bytes=0-9', 'Mon, 02 Mar 2026 10:00:00 GMT')).toEqual(part(0, 9))
    expect(ask('bytes=0-9', 'Mon, 02 Mar 2026 10:00:01 GMT')).toEqual({ status: 200 })
  })

  it('writes Content-Range with both ends and the whole', () => {
    expect(contentRange({ first: 10, last: 19 }, 1000)).toBe('bytes 10-19/1000')
  })
})

describe('what the client already holds (RFC 9110 section 13)', () => {
  const held = (ifNoneMatch: string | null, ifModifiedSince: string | null = null) =>
    isUnchanged({ ifNoneMatch, ifModifiedSince }, thing)

  it('is unchanged when any of its tags matches, weakly', () => {
    expect(held('"x", W/"rs-1"')).toBe(true)
    expect(held('*')).toBe(true)
    expect(held('"x"')).toBe(false)
  })

  it('looks at the date only where there is no tag', () => {
    expect(held(null, 'Mon, 02 Mar 2026 10:00:00 GMT')).toBe(true)
    expect(held(null, 'Mon, 02 Mar 2026 09:59:59 GMT')).toBe(false)
    expect(held('"x"', 'Mon, 02 Mar 2026 10:00:00 GMT')).toBe(false)
    expect(held(null, 'no date')).toBe(false)
  })
})
