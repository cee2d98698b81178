import type { Units } from '@/lib/auth/actor'
import { acresOf, hectaresOf, nextWindow, seasonFindings, type Finding } from '@/lib/seasons/rules'
import { seasonInput, type SeasonInput } from '@/lib/seasons/schema'
import type { SeasonView } from '@/lib/seasons/views'
import type { Crop } from '@/lib/topics/crops'
import type { StageKey } from '@/lib/topics/stage-words'

export type WindowDraft = { key: string; stage: StageKey; startsOn: string; endsOn: string }

/** A lane as it stands in the form: text where people type, so that half a number is not lost. */
export type PlantingDraft = {
  key: string
  crop: Crop
  field: string
  /** In the person's own units. */
  area: string
  /** Kept beside it: a field that nobody touched must not change by being shown in hectares. */
  areaAcres: number | null
  plantedOn: string
  windows: WindowDraft[]
}

const figure = (value: number) => String(Number(value.toPrecision(4)))

export const areaText = (areaAcres: number | null, units: Units) =>
  areaAcres === null ? '' : figure(units === 'us' ? areaAcres : hectaresOf(areaAcres))

/** NaN for what is no number; a comma is read as a decimal point. */
export function areaRead(text: string, units: Units): number | null {
  if (text.trim() === '') return null
  const value = Number(text.trim().replace(',', '.'))
  return units === 'us' ? value : acresOf(value)
}

/** The form as it opens on what is saved. */
export const draftOf = ({ plantings }: SeasonView, units: Units): PlantingDraft[] =>
  plantings.map(({ id, crop, field, areaAcres, plantedOn, windows }) => ({
    key: id,
    crop,
    field,
    area: areaText(areaAcres, units),
    areaAcres,
    plantedOn: plantedOn ?? '',
    windows: windows.map((window) => ({ key: `${id} ${window.startsOn}`, ...window })),
  }))

export const inputOf = (draft: PlantingDraft[]): SeasonInput => ({
  plantings: draft.map(({ crop, field, areaAcres, plantedOn, windows }) => ({
    crop,
    field,
    areaAcres,
    plantedOn: plantedOn || null,
    windows: windows.map(({ stage, startsOn, endsOn }) => ({ stage, startsOn, endsOn })),
  })),
})

/** What keeps the draft from being saved: first the shape of its fields, then the rules of a season. */
export function findingsOf(draft: PlantingDraft[], year: number): Finding[] {
  const input = inputOf(draft)
  const read = seasonInput.safeParse(input)
  if (read.success) return seasonFindings(year, read.data.plantings)
  return read.error.issues.map(({ path, message }) => ({
    path: path.join('.'),
    message: path.at(-1) === 'areaAcres' && message.includes('NaN') ? 'Give the area as a number' : message,
  }))
}

export type DraftChange =
  | { move: 'replace'; draft: PlantingDraft[] }
  | { move: 'add'; key: string }
  | { move: 'change'; key: string; to: Partial<Omit<PlantingDraft, 'key' | 'windows'>> }
  | { move: 'remove'; key: string }
  | { move: 'add-stage'; key: string; stageKey: string; year: number }
  | { move: 'change-stage'; key: string; stageKey: string; to: Partial<Omit<WindowDraft, 'key'>> }
  | { move: 'remove-stage'; key: string; stageKey: string }

const newLane = (key: string): PlantingDraft => ({
  key,
  crop: 'wheat',
  field: '',
  area: '',
  areaAcres: null,
  plantedOn: '',
  windows: [],
})

/** Stages that have both of their days; the others cannot say what comes next. */
const dated = ({ windows }: PlantingDraft) => windows.filter(({ startsOn, endsOn }) => startsOn !== '' && endsOn !== '')

function changedLane(lane: PlantingDraft, change: Exclude<DraftChange, { move: 'replace' | 'add' | 'remove' }>) {
  switch (change.move) {
    case 'change':
      return { ...lane, ...change.to }
    case 'add-stage': {
      const next = nextWindow(lane.crop, dated(lane), lane.plantedOn || null, change.year)
      return { ...lane, windows: [...lane.windows, { key: change.stageKey, ...next }] }
    }
    case 'change-stage':
      return {
        ...lane,
        windows: lane.windows.map((one) => (one.key === change.stageKey ? { ...one, ...change.to } : one)),
      }
    case 'remove-stage':
      return { ...lane, windows: lane.windows.filter(({ key }) => key !== change.stageKey) }
  }
}

/** One change of the form. Nothing is sorted while somebody is writing. */
export function draftAfter(draft: PlantingDraft[], change: DraftChange): PlantingDraft[] {
  if (change.move === 'replace') return change.draft
  if (change.move === 'add') return [...draft, newLane(change.key)]
  if (change.move === 'remove') return draft.filter(({ key }) => key !== change.key)
  return draft.map((lane) => (lane.key === change.key ? changedLane(lane, change) : lane))
}
