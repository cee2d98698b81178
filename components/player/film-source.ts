import type Hls from 'hls.js'
import type { ErrorData } from 'hls.js'
import { nextRemedy, patience, type FilmEvent, type Remedy, type Trouble } from './film-phase'
import { listenOnlyAddress } from './listen-only'

/** A height in lines, whatever the line carries, or the sound alone. */
export type PictureChoice = number | 'auto' | 'sound'

type Film = { hls: string; plain: string }
type Told = {
  happened: (event: FilmEvent) => void
  /** Called before the source changes under the film: keeps the place for the next one and answers it. Seconds. */
  keepPlace: () => number
  /** The height now shown, null for sound alone or when the browser chooses by itself. */
  shows: (height: number | null) => void
}

/** How the bytes come at the moment. */
type Way = 'hls' | 'native' | 'plain'

/**
 * Brings a film to a `<video>`: hls.js where the browser has Media Source Extensions, the browser's own HLS where it has
 * that, else the single plain file. Nothing is fetched before `begin`. Failures are mended mildest first.
 */
export class HlsFilmSource {
  #hls: Hls | null = null
  #way: Way | null = null
  #beginning: Promise<void> | null = null
  #choice: PictureChoice = 'auto'
  #tried: Remedy[] = []
  #waiting: ReturnType<typeof setTimeout> | undefined
  #gone = false

  constructor(
    readonly video: HTMLVideoElement,
    readonly film: Film,
    readonly told: Told,
  ) {
    video.addEventListener('error', this.#onVideoError)
  }

  begin(): Promise<void> {
    this.#beginning ??= this.#begin()
    return this.#beginning
  }

  /** Started by the browser's own controls before this script was there: leaves the running film alone. */
  adopt() {
    this.#way = 'plain'
    this.#beginning = Promise.resolve()
    this.told.happened('began')
    this.told.happened('can-play')
  }

  choose(choice: PictureChoice) {
    const before = this.#choice
    this.#choice = choice
    if (choice === before || this.#way === null) return
    if (choice === 'sound' || before === 'sound' || this.#way !== 'hls') this.#reopen()
    else this.#pickLevel()
  }

  close() {
    this.#gone = true
    this.video.removeEventListener('error', this.#onVideoError)
    this.#drop()
  }

  async #begin() {
    this.told.happened('began')
    const [{ default: Library }, address] = await Promise.all([import('hls.js'), this.#address()])
    if (this.#gone) return
    this.#drop()
    // The place may have moved while the library came; and the browser may have opened the plain file meanwhile.
    if (Library.isSupported()) return this.#useHls(Library, address, this.told.keepPlace())
    if (this.video.canPlayType('application/vnd.apple.mpegurl') === '') return this.#usePlain()
    this.#way = 'native'
    this.told.shows(null)
    this.told.keepPlace()
    this.video.src = address
  }

  /** The playlist to open. When the sound alone is wanted and there is none, the whole film is better than nothing. */
  async #address(): Promise<string> {
    const whole = new URL(this.film.hls, document.baseURI).href
    if (this.#choice !== 'sound') return whole
    const answer = await fetch(whole).catch(() => null)
    const master = answer?.ok ? await answer.text() : ''
    return listenOnlyAddress(master, whole) ?? whole
  }

  #useHls(Library: typeof Hls, address: string, at: number) {
    this.#way = 'hls'
    const hls = new Library({
      startPosition: at,
      capLevelToPlayerSize: true,
      // A worker from a blob would need a wider content security policy, and there is little to repackage in fMP4.
      enableWorker: false,
      // Captions are <track> elements of ours, so that they work without this library too.
      enableWebVTT: false,
      enableIMSC1: false,
      enableCEA708Captions: false,
    })
    this.#hls = hls
    hls.on(Library.Events.MANIFEST_PARSED, this.#pickLevel)
    hls.on(Library.Events.LEVEL_SWITCHED, () => this.told.shows(hls.levels[hls.currentLevel]?.height || null))
    hls.on(Library.Events.FRAG_BUFFERED, () => (this.#tried = this.#tried.filter((remedy) => remedy === 'rebuild')))
    hls.on(Library.Events.ERROR, (_event, error: ErrorData) => {
      if (error.fatal) this.#mend(error.type === Library.ErrorTypes.MEDIA_ERROR ? 'media' : 'network')
    })
    hls.loadSource(address)
    hls.attachMedia(this.video)
  }

  #usePlain() {
    this.#drop()
    this.#way = 'plain'
    this.told.shows(null)
    this.told.keepPlace()
    this.video.src = this.film.plain
  }

  #pickLevel = () => {
    const hls = this.#hls
    if (!hls) return
    const level = hls.levels.findIndex(({ height }) => height === this.#choice)
    hls.nextLevel = level
    if (hls.media?.readyState === 0 && level >= 0) hls.startLevel = level
  }

  #mend(trouble: Trouble) {
    const remedy = nextRemedy(this.#tried, trouble)
    if (remedy === 'give-up') return this.#giveUp()
    const pause = remedy === 'reload' ? patience(this.#tried) : 0
    this.#tried.push(remedy)
    this.told.happened('failed')
    this.#waiting = setTimeout(() => this.#apply(remedy), pause)
  }

  /** The next `begin`, by the viewer's hand or when the line is back, tries everything afresh. */
  #giveUp() {
    this.told.keepPlace()
    this.video.pause()
    this.#drop()
    this.#beginning = null
    this.#tried = []
    this.told.happened('gave-up')
  }

  #apply(remedy: Exclude<Remedy, 'give-up'>) {
    if (remedy === 'rebuild') this.#hls?.recoverMediaError()
    else if (remedy === 'plain') this.#goOn(() => Promise.resolve(this.#usePlain()))
    else this.#reopen()
  }

  #reopen() {
    this.#goOn(() => this.#begin())
  }

  /** Changes the source and goes on where, and as, the film was. */
  #goOn(change: () => Promise<void>) {
    const wasPlaying = !this.video.paused
    this.told.keepPlace()
    this.#beginning = change().then(async () => {
      if (wasPlaying && !this.#gone) await this.video.play().catch(() => undefined)
    })
  }

  #onVideoError = () => {
    // hls.js reports its own errors; those of the other two ways only show here.
    if (this.#way === 'native') this.#mend('network')
    else if (this.#way === 'plain') this.#mend('media')
  }

  #drop() {
    clearTimeout(this.#waiting)
    this.#hls?.destroy()
    this.#hls = null
  }
}
