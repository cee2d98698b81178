// @vitest-environment jsdom
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { Playback } from '@/components/player/playback'
import { fakeFilm } from './fake-film'

const film = fakeFilm()
const source = { begin: vi.fn(async () => undefined) }
let playback: Playback

beforeEach(() => {
  source.begin.mockClear()
  film.state.paused = true
  film.state.readyState = 1
  playback = new Playback(0, 300)
  playback.attach(film.media, source)
})

describe('the playback that film, row and text share', () => {
  it('fetches nothing before the first press', () => {
    playback.place(42)
    expect(source.begin).not.toHaveBeenCalled()
    expect(playback.read()).toMatchObject({ at: 42, phase: 'resting' })
  })

  it('begins the film before it plays it', async () => {
    await playback.play()
    expect(source.begin).toHaveBeenCalledTimes(1)
    expect(playback.read().playing).toBe(true)
  })

  it('shows a sought place at once and goes there when the film can', () => {
    film.state.readyState = 0
    playback.seek(125)
    film.plays(0)
    expect(playback.read().at).toBe(125)
    film.media.dispatchEvent(new Event('loadedmetadata'))
    expect(playback.read().at, 'a late event of the source before').toBe(125)
    film.state.readyState = 1
    film.media.dispatchEvent(new Event('loadedmetadata'))
    expect(film.media.currentTime).toBe(125)
  })

  it('keeps every place within the film', () => {
    playback.seek(-5)
    expect(playback.read().at).toBe(0)
    playback.seek(5000)
    expect(playback.read().at).toBe(300)
  })

  it('starts over when played at its end', async () => {
    playback.seek(300)
    await playback.play()
    expect(playback.read().at).toBe(0)
  })

  it('opens the next source where the last one stood', () => {
    film.plays(90)
    playback.keepPlace()
    film.plays(0)
    film.media.dispatchEvent(new Event('loadedmetadata'))
    expect(film.media.currentTime).toBe(90)
  })

  it('is in the chapter it was sent to, though the browser keeps the place a hair short', () => {
    film.plays(13.119999)
    expect(playback.read().at).toBe(13.12)
  })

  it('tells its listeners of changes only', () => {
    const listener = vi.fn()
    const stop = playback.subscribe(listener)
    film.plays(7)
    film.plays(7)
    expect(listener).toHaveBeenCalledTimes(1)
    stop()
    film.plays(8)
    expect(listener).toHaveBeenCalledTimes(1)
  })

  it('lets go of a film that is taken away', () => {
    const other = fakeFilm()
    const detach = playback.attach(other.media, source)
    detach()
    other.plays(55)
    expect(playback.read().at).not.toBe(55)
  })
})
