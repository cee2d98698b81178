import { act, type ReactNode } from 'react'
import { createRoot } from 'react-dom/client'
import { afterEach, vi } from 'vitest'
import { PlaybackProvider, usePlayback } from '@/components/player/playback-context'
import type { Playback } from '@/components/player/playback'
import { fakeFilm } from './fake-film'

vi.stubGlobal('IS_REACT_ACT_ENVIRONMENT', true)
vi.stubGlobal(
  'ResizeObserver',
  class {
    observe() {}
    disconnect() {}
  },
)

const undo: (() => void)[] = []
afterEach(() => undo.splice(0).forEach((step) => step()))

/** Draws pieces of the player over a film of `duration` seconds that opens at `at`. */
export function drawWithFilm(children: ReactNode, { at = 0, duration = 300 } = {}) {
  let playback: Playback | undefined
  const Reach = () => {
    const reached = usePlayback()
    return <i ref={() => void (playback = reached)} />
  }
  const place = document.body.appendChild(document.createElement('div'))
  const root = createRoot(place)
  act(() =>
    root.render(
      <PlaybackProvider at={at} duration={duration}>
        {children}
        <Reach />
      </PlaybackProvider>,
    ),
  )
  if (!playback) throw new Error('nothing was drawn')
  const film = fakeFilm(duration)
  playback.attach(film.media, { begin: async () => undefined })
  undo.push(() => {
    act(() => root.unmount())
    place.remove()
  })
  return { place, playback, plays: (second: number) => act(() => void film.plays(second)) }
}

/** The one element for a selector; a missing one fails the test in words. */
export function one<E extends HTMLElement = HTMLElement>(place: Element, selector: string): E {
  const found = place.querySelector<E>(selector)
  if (!found) throw new Error(`nothing matches ${selector}`)
  return found
}

export const press = (element: Element, key: string) =>
  act(() => element.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true })))

export const click = (element: HTMLElement) => act(() => element.click())
