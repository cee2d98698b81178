// @vitest-environment jsdom
import { act } from 'react'
import { describe, expect, it } from 'vitest'
import { TheRow } from '@/components/player/the-row'
import { click, drawWithFilm, one, press } from './drawn'

const chapters = [
  { start: 0, end: 60, title: 'Why we count now', stage: '1' as const },
  { start: 60, end: 160, title: 'Throwing the hoop', stage: '2' as const },
  { start: 160, end: 300, title: 'Your questions', stage: null },
]
const row = (
  <TheRow
    chapters={chapters}
    readings={[{ at: 72, quantity: 'soil at crown depth', value: 31, unit: '°F', note: null }]}
    questions={[
      {
        id: 'q1',
        title: 'Do dead tillers count?',
        state: 'answered',
        asking: 4,
        at: 100,
        url: '/questions/q1',
        followUp: { number: 11, url: '/channels/alder-fork/episodes/eleven?t=125', start: 125 },
      },
    ]}
    corrections={[]}
  />
)
const draw = (at = 0) => {
  const drawn = drawWithFilm(row, { at })
  return { ...drawn, slider: one(drawn.place, '[role="slider"]') }
}

describe('the row', () => {
  it('is a slider that says where the film is, of how long, in which chapter', () => {
    const { slider } = draw(72)
    expect(slider.getAttribute('aria-valuetext')).toBe('1 minute 12 seconds of 5 minutes, Throwing the hoop')
    expect(slider.getAttribute('aria-valuenow')).toBe('72')
    expect(slider.getAttribute('aria-valuemax')).toBe('300')
    expect(slider.tabIndex).toBe(0)
  })

  it('seeks by arrows, chapters and ends', () => {
    const { slider, playback } = draw(72)
    press(slider, 'ArrowRight')
    expect(playback.read().at).toBe(77)
    press(slider, 'PageDown')
    expect(playback.read().at).toBe(160)
    press(slider, 'Home')
    expect(playback.read().at).toBe(0)
    press(slider, 'End')
    expect(playback.read().at).toBe(300)
    expect(slider.getAttribute('aria-valuetext')).toContain('5 minutes of 5 minutes')
  })

  it('uses only its own keys', () => {
    const { slider } = draw()
    const event = new KeyboardEvent('keydown', { key: 'Tab', bubbles: true, cancelable: true })
    act(() => slider.dispatchEvent(event))
    expect(event.defaultPrevented).toBe(false)
  })

  it('does not speak every second while it has the focus and the film plays', async () => {
    const { slider, playback, plays } = draw(10)
    await act(async () => {
      slider.focus()
      await playback.play()
    })
    plays(14)
    expect(slider.getAttribute('aria-valuenow')).toBe('10')
    press(slider, 'ArrowRight')
    expect(slider.getAttribute('aria-valuenow')).toBe('19')
  })

  it('has a named button for each pin that opens its second', () => {
    const { place, playback } = draw()
    click(one(place, 'button[aria-label="Reading at 1:12: 31\u00a0°F soil at crown depth"]'))
    expect(playback.read().at).toBe(72)
  })

  it('draws the turn from an answered question to the second of its follow-up', () => {
    const { place, plays } = draw()
    expect(place.querySelector('a')).toBeNull()
    plays(90)
    const link = one<HTMLAnchorElement>(place, 'a')
    expect(link.textContent).toBe('Answered in episode 11, 2:05')
    expect(link.getAttribute('href')).toBe('/channels/alder-fork/episodes/eleven?t=125')
  })

  it('marks the chapter that plays and opens another by its title', () => {
    const { place, playback } = draw(72)
    expect(one(place, '[aria-current="true"]').textContent).toContain('Throwing the hoop')
    const last = [...place.querySelectorAll('button')].find((button) =>
      button.textContent?.startsWith('Your questions'),
    )
    if (last) click(last)
    expect(playback.read().at).toBe(160)
  })
})
