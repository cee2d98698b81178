import { describe, expect, it } from 'vitest'
import { wayBack } from '@/lib/auth/way-back'

describe('the way back after signing in', () => {
  it.each(['/desk/alder-fork', '/questions/ask?episode=1&t=3.2', '/search?q=größe'])('%s is ours', (address) =>
    expect(wayBack(encodeURI(decodeURI(address)))).toBe(encodeURI(address)),
  )

  it.each([
    '//elsewhere.example',
    '/\\elsewhere.example',
    'https:elsewhere.example',
    '/\t/elsewhere.example',
    'javascript:1',
    '\\\\elsewhere',
    '',
    '@elsewhere',
  ])('%j leads home', (address) => expect(wayBack(address)).toBe('/'))

  it('leads home when it is given twice or not at all', () => {
    expect([wayBack(undefined), wayBack(['/a', '/b'])]).toEqual(['/', '/'])
  })
})
