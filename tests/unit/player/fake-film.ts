import { vi } from 'vitest'

/** A media element of jsdom, which plays nothing, given the clock and the switches that a browser's has. */
export function fakeFilm(duration = 300) {
  const media = document.createElement('video')
  const state = { paused: true, readyState: 1 }
  let at = 0
  Object.defineProperties(media, {
    paused: { get: () => state.paused },
    readyState: { get: () => state.readyState },
    duration: { get: () => duration },
    currentTime: {
      get: () => at,
      set: (second: number) => {
        at = second
        media.dispatchEvent(new Event('timeupdate'))
      },
    },
  })
  media.play = vi.fn(async () => {
    state.paused = false
    media.dispatchEvent(new Event('play'))
  })
  media.pause = vi.fn(() => {
    state.paused = true
    media.dispatchEvent(new Event('pause'))
  })
  return { media, state, plays: (second: number) => (media.currentTime = second) }
}
