import type { Footage } from '@/models/footage'
import type { Rendition } from '@/models/rendition'
import type { FootageState } from './rules'

export type { FootageState }
export type RenditionView = { height: number; bitrate: number; bytes: number; ready: boolean }
export type FootageView = {
  id: string
  state: FootageState
  /** 0 to 1 over the whole of what is being done now */
  progress: number
  step: string | null
  filename: string
  bytes: number
  renditions: RenditionView[]
  error?: { code: string; detail: string }
}

/** Where a film stands, with what its own page shows beside it. */
export type FootageStatus = FootageView & {
  /** Bytes that have arrived; only while receiving. */
  received?: number
  duration: number | null
  /** What inspection noticed, in sentences. */
  notes: string[]
  /** A film to look at, as soon as the smallest size is there; a signed address. */
  preview: string | null
  /** Whether this is what the episode shows now. */
  isShown: boolean
}

export type LoadedFootage = Footage & { renditions?: Rendition[] }

export const footageView = (row: LoadedFootage): FootageView => ({
  id: row.id,
  state: row.state,
  progress: row.progress,
  step: row.step,
  filename: row.filename,
  bytes: row.bytes,
  renditions: [...(row.renditions ?? [])]
    .sort((a, b) => a.height - b.height)
    .map(({ height, bitrate, bytes, ready }) => ({ height, bitrate, bytes, ready })),
  ...(row.errorCode ? { error: { code: row.errorCode, detail: row.errorDetail ?? '' } } : {}),
})
