import { describe, expect, it } from 'vitest'
import { placesOf } from '@/components/player/find-rules'
import { isReading, scrollNeeded } from '@/components/player/follow-rules'

const view = { top: 100, bottom: 700 }

describe('following the picture', () => {
  it('leaves the text still while the sentence stands well in view', () => {
    expect(scrollNeeded({ top: 200, bottom: 250 }, view)).toBe(0)
  })

  it('scrolls down to a sentence that has run below, and up to one that was sought above', () => {
    expect(scrollNeeded({ top: 680, bottom: 730 }, view)).toBeGreaterThan(0)
    expect(scrollNeeded({ top: -400, bottom: -350 }, view)).toBeLessThan(0)
  })

  it('puts the sentence into the band, so that the next call has nothing to do', () => {
    const by = scrollNeeded({ top: 900, bottom: 940 }, view)
    expect(scrollNeeded({ top: 900 - by, bottom: 940 - by }, view)).toBe(0)
  })

  it('does nothing where the text is not shown', () => {
    expect(scrollNeeded({ top: 0, bottom: 0 }, { top: 0, bottom: 0 })).toBe(0)
  })

  it('gives way to a reader who scrolls by wheel, touch or key', () => {
    expect(isReading({ type: 'wheel', defaultPrevented: false })).toBe(true)
    expect(isReading({ type: 'touchmove', defaultPrevented: false })).toBe(true)
    expect(isReading({ type: 'keydown', key: 'PageDown', defaultPrevented: false })).toBe(true)
  })

  it('does not take a key for scrolling that moved the row or typed a letter', () => {
    expect(isReading({ type: 'keydown', key: 'PageDown', defaultPrevented: true })).toBe(false)
    expect(isReading({ type: 'keydown', key: 'a', defaultPrevented: false })).toBe(false)
    expect(isReading({ type: 'keydown', key: 'Tab', defaultPrevented: false })).toBe(false)
  })
})

describe('finding words in an episode', () => {
  const sentences = [{ text: 'A plant is one crown, not one stem.' }, { text: 'La macolla está viva: MACOLLA sana.' }]

  it('finds every place, whatever the case and the accents', () => {
    expect(placesOf(sentences, 'macolla')).toHaveLength(2)
    expect(placesOf(sentences, 'ESTA')).toEqual([{ sentence: 1, from: 11, to: 15 }])
    expect(placesOf(sentences, 'one')).toHaveLength(2)
  })

  it('takes the words of the reader as words, not as a pattern', () => {
    expect(placesOf(sentences, '.*')).toEqual([])
    expect(placesOf(sentences, '  one   crown ')).toHaveLength(1)
  })

  it('finds nothing for nothing', () => expect(placesOf(sentences, '  ')).toEqual([]))
})
