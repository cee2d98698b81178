import { addDays, dayAndMonth, dayNumber, monthsBetween, yearOf, type Day } from '@/lib/dates/rules'
import { topicByCode } from '@/lib/topics/rules'
import { cropWord, type Crop } from '@/lib/topics/crops'
import { stageKeys, stageWord, type StageKey } from '@/lib/topics/stage-words'
import type { PlantingInput, StageWindowInput } from './schema'

export type Finding = { path: string; message: string }

/** Stages that the crop's published key has (maize has no 2 and no 4), and the ground before sowing. */
export const stagesOf = (crop: Crop): StageKey[] =>
  stageKeys.filter((stage) => stage === 'soil' || topicByCode(`${crop}-${stage}`) !== null)

/** The code that a stage of a crop is filed and searched under: `wheat-2`, `soil`. */
export const stageCode = (crop: Crop, stage: StageKey) => (stage === 'soil' ? 'soil' : `${crop}-${stage}`)

/**
 * The days that a crop year may hold: from July before, when land for a winter crop is worked, to June after, when a
 * crop sown late in the southern year is harvested.
 */
export const reachOf = (year: number): { from: Day; to: Day } => ({
  from: `${year - 1}-07-01`,
  to: `${year + 1}-06-30`,
})

function outsideReach(day: Day, year: number): boolean {
  const { from, to } = reachOf(year)
  return day < from || day > to
}

const byStart = <T extends { startsOn: Day }>(windows: T[]) =>
  [...windows].sort((a, b) => (a.startsOn < b.startsOn ? -1 : a.startsOn > b.startsOn ? 1 : 0))

/** Stages of one planting in the order of the year. */
export const inOrder = byStart

function windowFindings(window: StageWindowInput, crop: Crop, year: number, path: string): Finding[] {
  const findings: Finding[] = []
  if (!stagesOf(crop).includes(window.stage)) {
    findings.push({ path: `${path}.stage`, message: `${cropWord(crop)} has no stage ${window.stage} in the BBCH key` })
  }
  if (window.startsOn > window.endsOn) findings.push({ path: `${path}.endsOn`, message: 'It ends before it begins' })
  for (const side of ['startsOn', 'endsOn'] as const) {
    if (outsideReach(window[side], year)) findings.push({ path: `${path}.${side}`, message: outside(year) })
  }
  return findings
}

const outside = (year: number) => `The ${year} season runs from July ${year - 1} to June ${year + 1} at most`

/** Two stages of one planting on one day: one crop stands in one stage at a time. Ends are inclusive. */
function overlapFindings(planting: PlantingInput, path: string): Finding[] {
  const ordered = byStart(planting.windows.map((window, index) => ({ ...window, index })))
  return ordered.flatMap((window, at) => {
    const before = ordered[at - 1]
    if (!before || window.startsOn > before.endsOn) return []
    const word = stageWord(before.stage, planting.crop)
    const message = `${word} is set until ${dayAndMonth(before.endsOn)}; begin after it`
    return [{ path: `${path}.windows.${window.index}.startsOn`, message }]
  })
}

function plantingFindings(planting: PlantingInput, year: number, path: string): Finding[] {
  const { crop, plantedOn, windows } = planting
  const planted =
    plantedOn && outsideReach(plantedOn, year) ? [{ path: `${path}.plantedOn`, message: outside(year) }] : []
  const each = windows.flatMap((window, at) => windowFindings(window, crop, year, `${path}.windows.${at}`))
  return [...planted, ...each, ...overlapFindings(planting, path)]
}

/** What is wrong with a season beyond the shape of its fields; empty when it can be saved. */
export function seasonFindings(year: number, plantings: PlantingInput[]): Finding[] {
  const laneOf = ({ crop, field }: PlantingInput) => `${crop} ${field.trim()}`
  return plantings.flatMap((planting, index) => {
    const first = plantings.findIndex((other) => laneOf(other) === laneOf(planting))
    const twice =
      first < index ? [{ path: `plantings.${index}.field`, message: 'This crop stands on this field already' }] : []
    return [...twice, ...plantingFindings(planting, year, `plantings.${index}`)]
  })
}

/** The stage a planting stands in on a day; null between stages, before the first and after the last. */
export function stageOn<T extends { startsOn: Day; endsOn: Day }>(windows: T[], day: Day): T | null {
  return windows.find(({ startsOn, endsOn }) => startsOn <= day && day <= endsOn) ?? null
}

/** A next stage to offer in the editor: the following one of the key, two weeks from the day after the last. */
export function nextWindow(
  crop: Crop,
  windows: StageWindowInput[],
  plantedOn: Day | null,
  year: number,
): StageWindowInput {
  const last = byStart(windows).at(-1)
  const stages = stagesOf(crop)
  const stage = last ? (stages[stages.indexOf(last.stage) + 1] ?? '9') : '0'
  const startsOn = last ? addDays(last.endsOn, 1) : (plantedOn ?? `${year}-04-01`)
  return { stage, startsOn, endsOn: addDays(startsOn, 13) }
}

/** The season to open when none is named: the one of this year, else the nearest that exists. */
export function seasonToShow(years: number[], today: Day): number | null {
  const year = yearOf(today)
  return [...years].sort((a, b) => Math.abs(a - year) - Math.abs(b - year) || b - a)[0] ?? null
}

/** International acre, 4046.8564224 m² (NIST Handbook 44, appendix C). */
const HECTARES_PER_ACRE = 0.40468564224

export const hectaresOf = (areaAcres: number) => areaAcres * HECTARES_PER_ACRE
export const acresOf = (areaHa: number) => areaHa / HECTARES_PER_ACRE

const short = (value: number) => String(Number(value.toPrecision(value < 10 ? 2 : 3)))

/** A field's size in the person's units: `64 ac`, `25.9 ha`. */
export const areaWords = (areaAcres: number, units: 'us' | 'metric') =>
  units === 'us' ? `${short(areaAcres)} ac` : `${short(hectaresOf(areaAcres))} ha`

/** Days in a stage, both ends counted. */
export const daysIn = ({ startsOn, endsOn }: { startsOn: Day; endsOn: Day }) =>
  dayNumber(endsOn) - dayNumber(startsOn) + 1

/** The days a board shows: the calendar year, and further out to whole months where a lane needs it. */
export function boardSpan(
  year: number,
  plantings: { windows: { startsOn: Day; endsOn: Day }[] }[],
): { from: Day; to: Day } {
  const windows = plantings.flatMap((planting) => planting.windows)
  const first = windows.reduce((day, { startsOn }) => (startsOn < day ? startsOn : day), `${year}-01-01`)
  const last = windows.reduce((day, { endsOn }) => (endsOn > day ? endsOn : day), `${year}-12-31`)
  const [nextMonth] = monthsBetween(addDays(`${last.slice(0, 7)}-28`, 4), addDays(`${last.slice(0, 7)}-28`, 4))
  return { from: `${first.slice(0, 7)}-01`, to: addDays(nextMonth ?? last, -1) }
}

/** The crop that most of these codes are filed under, one code per chapter counted; the first one when even. */
export function mainCrop(codes: string[]): Crop | null {
  const counts = new Map<Crop, number>()
  for (const code of codes) {
    const crop = topicByCode(code)?.crop
    if (crop) counts.set(crop, (counts.get(crop) ?? 0) + 1)
  }
  return [...counts].sort(([, a], [, b]) => b - a)[0]?.[0] ?? null
}
