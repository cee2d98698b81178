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
