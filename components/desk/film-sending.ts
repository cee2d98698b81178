import { Upload, type DetailedError } from 'tus-js-client'
import { chunkBytes, paceOf } from '@/lib/footage/rules'

export type Sending =
  | { phase: 'none' }
  | { phase: 'sending' | 'paused' | 'offline'; name: string; sent: number; total: number; pace: number | null }
  | { phase: 'failed'; name: string; sent: number; total: number; status: number }
  | { phase: 'arrived'; name: string; total: number }

const none: Sending = { phase: 'none' }
const paceOverMs = 12_000
/** After the quick tries of the client itself; a line that is down for an hour comes back by itself. */
const tryAgainMs = 15_000

/**
 * One film on its way to an episode. It outlives the page that began it, so that chapters can be named while it is sent; a
 * closed window stops it, and the server knows how far it came.
 */
export class FilmSending {
  #state: Sending = none
  #listeners = new Set<() => void>()
  #upload: Upload | null = null
  #samples: [number, number][] = []
  #again: ReturnType<typeof setTimeout> | undefined

  constructor(readonly episodeId: string) {}

  subscribe = (listener: () => void) => {
    this.#listeners.add(listener)
    return () => void this.#listeners.delete(listener)
  }

  now = (): Sending => this.#state

  /** @param unfinished the upload on the server that this very file belongs to, to go on with it */
  start(file: File, unfinished: string | null): void {
    this.#drop()
    this.#upload = new Upload(file, {
      ...(unfinished ? { uploadUrl: `/api/footage/${unfinished}` } : { endpoint: '/api/footage' }),
      chunkSize: chunkBytes,
      retryDelays: [0, 1000, 3000, 8000],
      // The server knows every unfinished upload of an episode, in any browser; nothing is kept in this one.
      storeFingerprintForResuming: false,
      metadata: { episodeId: this.episodeId, filename: file.name, filetype: file.type },
      onProgress: (sent, total) => this.#progressed(file.name, sent, total),
      onSuccess: () => this.#become({ phase: 'arrived', name: file.name, total: file.size }),
      onError: (error) => this.#failed(file, error),
    })
    this.#become({ phase: 'sending', name: file.name, sent: 0, total: file.size, pace: null })
    this.#upload.start()
  }

  pause = (): void => {
    clearTimeout(this.#again)
    void this.#upload?.abort()
    if ('sent' in this.#state) this.#become({ ...this.#state, phase: 'paused', pace: null })
  }

  goOn = (): void => {
    clearTimeout(this.#again)
    if (!('sent' in this.#state)) return
    this.#samples = []
    this.#become({ ...this.#state, phase: 'sending', pace: null })
    this.#upload?.start()
  }

  /** Stops for good and frees what has arrived. */
  giveUp = async (): Promise<void> => {
    const upload = this.#upload
    this.#drop()
    await upload?.abort(true).catch(() => undefined)
    this.#become(none)
  }

  /** Forgets a film that has arrived, or a refusal that was read. */
  clear = (): void => {
    this.#drop()
    this.#become(none)
  }

  #drop() {
    clearTimeout(this.#again)
    void this.#upload?.abort()
    this.#upload = null
    this.#samples = []
  }

  #become(state: Sending) {
    this.#state = state
    for (const listener of this.#listeners) listener()
  }

  #progressed(name: string, sent: number, total: number) {
    if (this.#state.phase !== 'sending') return
    const at = performance.now()
    this.#samples = [...this.#samples.filter(([when]) => at - when < paceOverMs), [at, sent]]
    this.#become({ phase: 'sending', name, sent, total, pace: paceOf(this.#samples) })
  }

  #failed(file: File, error: Error | DetailedError) {
    const sent = 'sent' in this.#state ? this.#state.sent : 0
    const about = { name: file.name, sent, total: file.size }
    const status = ('originalResponse' in error && error.originalResponse?.getStatus()) || 0
    if (status >= 400 && status < 500 && status !== 409 && status !== 423) {
      return this.#become({ phase: 'failed', ...about, status })
    }
    this.#become({ phase: 'offline', ...about, pace: null })
    this.#again = setTimeout(this.#lineIsBack, tryAgainMs)
    window.addEventListener('online', this.#lineIsBack, { once: true })
  }

  /** Paused or given up meanwhile, it stays so. */
  #lineIsBack = () => {
    if (this.#state.phase === 'offline') this.goOn()
  }
}

const sendings = new Map<string, FilmSending>()

/** The one film that is on its way to this episode in this window. */
export function sendingTo(episodeId: string): FilmSending {
  const known = sendings.get(episodeId) ?? new FilmSending(episodeId)
  sendings.set(episodeId, known)
  return known
}
