import { phaseAfter, type FilmEvent, type FilmPhase } from './film-phase'

/** What the page knows of the film at one moment. Seconds. */
export type Moment = {
  at: number
  duration: number
  playing: boolean
  phase: FilmPhase
  rate: number
  volume: number
  muted: boolean
}

/** Whatever brings the bytes. `begin` may be called again and then does nothing. */
export type FilmSource = { begin(): Promise<void> }

const playerEvents = ['play', 'pause', 'ended', 'ratechange', 'volumechange', 'durationchange'] as const

/**
 * The state that the film, the row and the text share. It stands outside React: a component subscribes to the one
 * value it shows, so a tick of the film renders the clock and not two thousand lines of text.
 */
export class Playback {
  #moment: Moment
  #first: Moment
  #listeners = new Set<() => void>()
  #media: HTMLMediaElement | null = null
  #source: FilmSource | null = null
  /** A place asked for before the film could go there. */
  #wanted: number | null

  constructor(at: number, duration: number) {
    this.#moment = { at, duration, playing: false, phase: 'resting', rate: 1, volume: 1, muted: false }
    this.#first = this.#moment
    this.#wanted = at > 0 ? at : null
  }

  subscribe = (listener: () => void) => {
    this.#listeners.add(listener)
    return () => void this.#listeners.delete(listener)
  }

  read = () => this.#moment
  /** The moment as the server drew it. */
  readFirst = () => this.#first

  /** Takes over a media element until the returned function is called. */
  attach(media: HTMLMediaElement, source: FilmSource): () => void {
    this.#media = media
    this.#source = source
    const listening = new AbortController()
    const on = (event: string, listener: () => void) =>
      media.addEventListener(event, listener, { signal: listening.signal })
    for (const event of playerEvents) on(event, this.#copyState)
    on('timeupdate', this.#copyPlace)
    on('loadedmetadata', this.#goToWanted)
    for (const event of ['canplay', 'playing', 'seeked']) on(event, () => this.happened('can-play'))
    on('waiting', () => this.happened('ran-dry'))
    this.#meet(media)
    return () => {
      listening.abort()
      this.#media = null
      this.#source = null
    }
  }

  happened(event: FilmEvent) {
    this.#change({ phase: phaseAfter(this.#moment.phase, event) })
  }

  /** Moves the needle without fetching anything: for a place kept from an earlier visit. */
  place(at: number) {
    this.#wanted = this.#within(at)
    this.#change({ at: this.#wanted })
  }

  seek(at: number) {
    this.place(at)
    void this.#source?.begin()
    this.#goToWanted()
  }

  step(seconds: number) {
    this.seek(this.#moment.at + seconds)
  }

  async play() {
    if (this.#moment.duration > 0 && this.#moment.at >= this.#moment.duration - 0.25) this.seek(0)
    await this.#source?.begin()
    // Refused when the browser wants another press first, or cut short by a pause: both show as paused.
    await this.#media?.play().catch(() => undefined)
  }

  pause() {
    this.#media?.pause()
  }

  toggle() {
    if (this.#moment.playing) this.pause()
    else void this.play()
  }

  setRate(rate: number) {
    if (this.#media) this.#media.playbackRate = this.#media.defaultPlaybackRate = rate
  }

  setVolume(volume: number) {
    if (!this.#media) return
    this.#media.volume = Math.min(1, Math.max(0, volume))
    this.#media.muted = false
  }

  setMuted(muted: boolean) {
    if (this.#media) this.#media.muted = muted
  }

  /** Before a source is changed under the film: the next one opens where this one stood. */
  keepPlace() {
    this.#wanted = this.#moment.at
    return this.#moment.at
  }

  /** A film that the browser opened before this script was there; one that plays already is where its viewer wants it. */
  #meet(media: HTMLMediaElement) {
    if (media.paused) return this.#goToWanted()
    this.#wanted = null
    this.#copyPlace()
    this.#copyState()
  }

  #within(at: number) {
    return Math.min(Math.max(0, at), this.#moment.duration || Infinity)
  }

  // Events of the source before still arrive when the next is being opened; an element without metadata is at no place.
  #goToWanted = () => {
    if (!this.#media || this.#media.readyState === 0) return
    if (this.#wanted !== null) this.#media.currentTime = this.#wanted
    this.#wanted = null
  }

  #copyPlace = () => {
    if (!this.#media || this.#media.readyState === 0) return
    // A source that is just opening reports 0 until it has been sent to the wanted place.
    // Whole milliseconds, the grain of chapters and cues: sent to 13.12, Chromium answers 13.119999.
    if (this.#wanted === null) this.#change({ at: Math.round(this.#media.currentTime * 1000) / 1000 })
  }

  #copyState = () => {
    const media = this.#media
    if (!media) return
    this.#change({
      playing: !media.paused && !media.ended,
      rate: media.playbackRate,
      volume: media.volume,
      muted: media.muted,
      duration: Number.isFinite(media.duration) && media.duration > 0 ? media.duration : this.#moment.duration,
    })
  }

  #change(part: Partial<Moment>) {
    const next = { ...this.#moment, ...part }
    const same = (Object.keys(part) as (keyof Moment)[]).every((key) => next[key] === this.#moment[key])
    if (same) return
    this.#moment = next
    for (const listener of this.#listeners) listener()
  }
}
