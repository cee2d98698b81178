import { describe, expect, it } from 'vitest'
import { placeAfterKey } from '@/components/player/player-keys'

const chapters = [
  { start: 0, end: 60 },
  { start: 62, end: 160 },
  { start: 160, end: 290 },
]
const from = (at: number) => ({ at, duration: 300 })

describe('keys on the row', () => {
  it.each([
    ['ArrowRight', 100, 105],
    ['ArrowUp', 100, 105],
    ['ArrowLeft', 100, 95],
    ['ArrowDown', 100, 95],
    ['ArrowLeft', 2, 0],
    ['ArrowRight', 298, 300],
    ['Home', 100, 0],
    ['End', 100, 300],
    ['PageDown', 10, 62],
    ['PageDown', 62, 160],
    ['PageDown', 200, 300],
    ['PageUp', 100, 62],
    ['PageUp', 62.5, 0],
    ['PageUp', 161, 62],
    ['PageUp', 200, 160],
    ['PageUp', 1, 0],
    ['PageUp', 61, 0],
    ['PageUp', 295, 160],
  ])('%s at %d goes to %d', (key, at, to) => expect(placeAfterKey(key, from(at), chapters)).toBe(to))

  it('leaves every other key to the browser', () => {
    expect(placeAfterKey('Tab', from(10), chapters)).toBeNull()
    expect(placeAfterKey('k', from(10), chapters)).toBeNull()
  })
})
