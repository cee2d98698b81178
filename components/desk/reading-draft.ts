import type { EpisodeView } from '@/lib/episodes/views'
import { parseTime, writeTime } from '@/lib/times/parse'

/** A reading while it is being written: everything as typed. */
export type ReadingDraft = { key: string; at: string; quantity: string; value: string; unit: string; note: string }

let made = 0
const freshKey = () => `reading-${++made}`

export const emptyReading = (): ReadingDraft => ({
  key: freshKey(),
  at: '',
  quantity: '',
  value: '',
  unit: '',
  note: '',
})

export const readingDrafts = ({ readings }: EpisodeView): ReadingDraft[] =>
  readings.map(({ at, quantity, value, unit, note }) => ({
    key: freshKey(),
    at: writeTime(at),
    quantity,
    value: String(value),
    unit,
    note: note ?? '',
  }))

/** A figure as people write it, with a point or a comma. */
const figureOf = (written: string) => (written.trim() === '' ? NaN : Number(written.trim().replace(',', '.')))

export const isSoundReading = ({ at, quantity, value }: ReadingDraft): boolean =>
  parseTime(at) !== null && quantity.trim() !== '' && Number.isFinite(figureOf(value))

export const readingsBody = (drafts: ReadingDraft[]) =>
  drafts.map(({ at, quantity, value, unit, note }) => ({
    at: parseTime(at) ?? 0,
    quantity,
    value: figureOf(value),
    unit,
    note: note.trim() || null,
  }))
