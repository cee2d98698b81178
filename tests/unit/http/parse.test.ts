import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { Problem } from '@/lib/errors'
import { ANY_EDITION, parseEdition, parseJson, parseQuery } from '@/lib/http/parse'
import { decodeCursor, encodeCursor } from '@/lib/http/paging'

const json = (body: string, type = 'application/json') =>
  new Request('http://farm.example/x', { method: 'POST', body, headers: { 'content-type': type } })
const statusOf = async (work: Promise<unknown>) => work.then(() => 200).catch((failure: Problem) => failure.status)
const schema = z.object({ title: z.string() })

describe('a body', () => {
  it.each([
    ['broken JSON', json('{'), 400],
    ['a wrong shape', json('{"title":1}'), 400],
    ['a NUL character', json('{"title":"a\\u0000b"}'), 400],
    ['another type', json('{"title":"a"}', 'text/plain'), 415],
    ['over a megabyte', json(JSON.stringify({ title: 'a'.repeat(1_100_000) })), 413],
    ['what was asked for', json('{"title":"a"}'), 200],
    ['a type with a charset', json('{"title":"a"}', 'application/json; charset=utf-8'), 200],
  ])('with %s answers as it should', async (_, request, status) => {
    expect(await statusOf(parseJson(schema, request))).toBe(status)
  })

  it('cannot reach the prototype', async () => {
    const loose = z.looseObject({})
    const read = await parseJson(loose, json('{"__proto__":{"admin":true},"title":"a"}'))
    expect((read as { admin?: boolean }).admin).toBeUndefined()
  })
})

describe('a query', () => {
  it('is refused when one name is given twice', () => {
    expect(() => parseQuery(z.object({}), new URL('http://farm.example/?a=1&a=2'))).toThrow(Problem)
  })
})

describe('If-Match', () => {
  const edition = (value?: string) =>
    new Request('http://farm.example/', { headers: value ? { 'if-match': value } : {} })

  // RFC 9110, 13.1.1: `*` matches any, a list or a weak tag is none of ours and matches nothing.
  it.each([
    ['"7"', 7],
    ['*', ANY_EDITION],
    ['W/"7"', 0],
    ['"seven"', 0],
  ])('%s reads as %i', (value, read) => expect(parseEdition(edition(value), true)).toBe(read))

  it('is asked for with 428 where it is needed, and stands for any where it is not', () => {
    expect(() => parseEdition(edition(), true)).toThrow(/428/)
    expect(parseEdition(edition(), 'optional')).toBe(ANY_EDITION)
  })
})

describe('a cursor', () => {
  it('comes back as it went out, and nothing else is taken for one', () => {
    expect(decodeCursor(encodeCursor(['2026-12-01', 7]), 2)).toEqual(['2026-12-01', 7])
    for (const wrong of ['', 'x', encodeCursor([1]), Buffer.from('{"a":1}').toString('base64url')])
      expect(() => decodeCursor(wrong, 2)).toThrow(Problem)
  })
})
