// @vitest-environment jsdom
import { act } from 'react'
import { describe, expect, it, vi } from 'vitest'
import { AsSpoken } from '@/components/player/as-spoken'
import { click, drawWithFilm, one } from './drawn'

vi.stubGlobal('matchMedia', () => ({ matches: false, addEventListener() {}, removeEventListener() {} }))

const cue = (start: number, text: string) => ({ start, end: start + 4, text, speaker: null, terms: [] })
const spoken = [cue(2, 'Walk in past the headland.'), cue(62, 'Count the crowns.'), cue(66, 'Keep the bad ones in.')]
const chapters = [
  { start: 0, end: 60, title: 'Why we count now', stage: '1' as const },
  { start: 60, end: 300, title: 'Throwing the hoop', stage: '2' as const },
]
const corrections = [{ id: 'c', at: 64, said: 'crowns', right: 'plants', on: '2026-04-02T10:00:00Z' }]
const draw = () => drawWithFilm(<AsSpoken spoken={spoken} chapters={chapters} corrections={corrections} notes={{}} />)
const button = (place: Element, words: string) =>
  [...place.querySelectorAll('button')].find((one) => one.textContent === words)
const wheel = (element: Element) => act(() => element.dispatchEvent(new Event('wheel', { bubbles: true })))

describe('the text as spoken', () => {
  it('stands under the titles of its chapters, with links to its seconds', () => {
    const { place } = draw()
    expect([...place.querySelectorAll('h3')].map((title) => title.textContent)).toEqual(
      chapters.map((one) => one.title),
    )
    expect([...place.querySelectorAll('a')].map((link) => link.getAttribute('href'))).toEqual(['?t=2', '?t=62'])
  })

  it('rules the sentence that is spoken, and only that one', () => {
    const { place, plays } = draw()
    expect(place.querySelector('[data-now]')).toBeNull()
    plays(63)
    expect(one(place, '[data-now]').textContent).toBe('Count the crowns.')
    plays(67)
    expect(one(place, '[data-now]').textContent).toBe('Keep the bad ones in.')
    expect(place.querySelectorAll('[data-now]')).toHaveLength(1)
  })

  it('opens the second of a sentence that is clicked, and of a time in the margin', () => {
    const { place, playback } = draw()
    click(one(place, '[data-start="66"]'))
    expect(playback.read().at).toBe(66)
    click(one(place, 'a[href="?t=2"]'))
    expect(playback.read().at).toBe(2)
  })

  it('stops following a reader who scrolls away, until asked', () => {
    const { place } = draw()
    expect(button(place, 'Follow the picture')).toBeUndefined()
    wheel(one(place, 'p'))
    const follow = button(place, 'Follow the picture')
    if (follow) click(follow)
    expect(follow).toBeDefined()
    expect(button(place, 'Follow the picture')).toBeUndefined()
  })

  it('stays with a reader who turns the wheel over the row of the player', () => {
    const { place } = draw()
    const slider = place.appendChild(document.createElement('div'))
    slider.setAttribute('role', 'slider')
    act(() => slider.dispatchEvent(new Event('touchmove', { bubbles: true })))
    expect(button(place, 'Follow the picture')).toBeUndefined()
  })

  it('sets a correction where the mistake was said', () => {
    const { place } = draw()
    expect(one(place, '[role="note"]').textContent).toBe('Correction, 2 April 2026: said crowns, right is plants')
    expect(one(place, '[role="note"]').previousElementSibling?.textContent).toContain('Count the crowns.')
  })

  it('says what will be there when there are no captions', () => {
    const { place } = drawWithFilm(<AsSpoken spoken={[]} chapters={chapters} corrections={[]} notes={{}} />)
    expect(place.textContent).toContain('No captions yet')
  })

  it('finds words and opens them at their second', async () => {
    const { place, playback } = draw()
    const find = button(place, 'Find in this episode')
    if (find) click(find)
    const field = one<HTMLInputElement>(place, 'input[type="search"]')
    await act(async () => {
      Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set?.call(field, 'bad ones')
      field.dispatchEvent(new Event('input', { bubbles: true }))
    })
    expect(one(place, '[role="status"]').textContent).toBe('1 place')
    click(one(place, '[role="search"] a'))
    expect(playback.read().at).toBe(66)
  })
})
