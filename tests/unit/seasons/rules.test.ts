import { describe, expect, it } from 'vitest'
import {
  acresOf,
  areaWords,
  boardSpan,
  hectaresOf,
  mainCrop,
  nextWindow,
  seasonFindings,
  seasonToShow,
  stageCode,
  stageOn,
  stagesOf,
} from '@/lib/seasons/rules'
import type { PlantingInput, StageWindowInput } from '@/lib/seasons/schema'

const lane = (windows: StageWindowInput[], given: Partial<PlantingInput> = {}): PlantingInput => ({
  crop: 'wheat',
  field: 'Long Field',
  areaAcres: 64,
  plantedOn: null,
  windows,
  ...given,
})
const window = (stage: StageWindowInput['stage'], startsOn: string, endsOn: string) => ({ stage, startsOn, endsOn })
const paths = (year: number, plantings: PlantingInput[]) => seasonFindings(year, plantings).map(({ path }) => path)

describe('a season can be saved', () => {
  it('with stages that follow each other, touch, or leave a gap', () => {
    const windows = [
      window('2', '2026-01-01', '2026-03-28'),
      window('3', '2026-03-29', '2026-04-25'),
      window('5', '2026-05-05', '2026-05-13'),
    ]
    expect(seasonFindings(2026, [lane(windows)])).toEqual([])
  })

  it('with stages written in any order', () => {
    const windows = [window('3', '2026-03-29', '2026-04-25'), window('2', '2026-01-01', '2026-03-28')]
    expect(seasonFindings(2026, [lane(windows)])).toEqual([])
  })

  it('with a stage of one day, and over 29 February', () => {
    expect(seasonFindings(2024, [lane([window('2', '2024-02-29', '2024-02-29')])])).toEqual([])
  })

  it('with the same crop on two fields and two crops on one', () => {
    expect(seasonFindings(2026, [lane([]), lane([], { field: 'Bottom' }), lane([], { crop: 'soybean' })])).toEqual([])
  })
})

describe('a season cannot be saved', () => {
  it('when two stages share a day, ends being days too', () => {
    const windows = [window('2', '2026-01-01', '2026-03-29'), window('3', '2026-03-29', '2026-04-25')]
    expect(seasonFindings(2026, [lane(windows)])).toEqual([
      { path: 'plantings.0.windows.1.startsOn', message: 'Tillering is set until 29 March; begin after it' },
    ])
  })

  it('names the later one of an overlap by its place in the form, not in the year', () => {
    const windows = [window('3', '2026-03-01', '2026-04-25'), window('2', '2026-01-01', '2026-03-28')]
    expect(paths(2026, [lane(windows)])).toEqual(['plantings.0.windows.0.startsOn'])
  })

  it('when a stage ends before it begins', () => {
    expect(paths(2026, [lane([window('2', '2026-03-28', '2026-03-27')])])).toEqual(['plantings.0.windows.0.endsOn'])
  })

  it('when the same crop stands on the same field twice', () => {
    expect(paths(2026, [lane([]), lane([], { field: ' Long Field ' })])).toEqual(['plantings.1.field'])
  })

  it('with a stage that the published key of the crop does not have (BBCH, Meier 2001: maize has no 2 and no 4)', () => {
    const lanes = [lane([window('2', '2026-05-01', '2026-05-20')], { crop: 'maize' })]
    expect(paths(2026, lanes)).toEqual(['plantings.0.windows.0.stage'])
    expect(stagesOf('maize')).not.toContain('4')
    expect(stagesOf('wheat')).toEqual(['soil', '0', '1', '2', '3', '4', '5', '6', '7', '8', '9'])
  })

  it('with days that belong to another year, a common slip of the keyboard', () => {
    const lanes = [lane([window('2', '2062-01-01', '2062-03-28')], { plantedOn: '2006-10-06' })]
    expect(paths(2026, lanes)).toEqual([
      'plantings.0.plantedOn',
      'plantings.0.windows.0.startsOn',
      'plantings.0.windows.0.endsOn',
    ])
  })
})

describe('the days of a board', () => {
  it('are the calendar year', () => {
    expect(boardSpan(2026, [])).toEqual({ from: '2026-01-01', to: '2026-12-31' })
  })

  it('reach back over the year end for a winter crop, by whole months', () => {
    const lanes = [{ windows: [window('soil', '2025-09-19', '2025-10-05'), window('9', '2026-07-04', '2026-07-25')] }]
    expect(boardSpan(2026, lanes)).toEqual({ from: '2025-09-01', to: '2026-12-31' })
  })

  it('reach into the next year for a crop sown in spring south of the equator, leap February included', () => {
    const lanes = [{ windows: [window('8', '2027-12-01', '2028-02-03')] }]
    expect(boardSpan(2027, lanes)).toEqual({ from: '2027-01-01', to: '2028-02-29' })
  })
})

describe('a stage on a day', () => {
  const windows = [window('2', '2026-01-01', '2026-03-28'), window('5', '2026-05-05', '2026-05-13')]

  it('counts both ends', () => {
    expect(stageOn(windows, '2026-01-01')?.stage).toBe('2')
    expect(stageOn(windows, '2026-03-28')?.stage).toBe('2')
  })

  it('is none in a gap, before and after', () => {
    for (const day of ['2025-12-31', '2026-03-29', '2026-05-14']) expect(stageOn(windows, day), day).toBeNull()
  })
})

describe('the next stage offered', () => {
  it('is the one that follows in the key of the crop, from the next day on', () => {
    const next = nextWindow('maize', [window('1', '2026-05-03', '2026-06-06')], null, 2026)
    expect(next).toEqual({ stage: '3', startsOn: '2026-06-07', endsOn: '2026-06-20' })
  })

  it('begins on the day of planting in an empty lane', () => {
    expect(nextWindow('wheat', [], '2025-10-06', 2026)).toMatchObject({ stage: '0', startsOn: '2025-10-06' })
  })
})

describe('the season shown when none is named', () => {
  it('is the one of this year, else the nearest, the later of two', () => {
    expect(seasonToShow([2024, 2025, 2026], '2026-06-01')).toBe(2026)
    expect(seasonToShow([2023, 2024], '2026-06-01')).toBe(2024)
    expect(seasonToShow([2025, 2027], '2026-06-01')).toBe(2027)
    expect(seasonToShow([], '2026-06-01')).toBeNull()
  })
})

describe('the crop of an episode', () => {
  it('is the one most chapters are filed under; jobs and subjects have none', () => {
    expect(mainCrop(['job-drilling', 'soybean-0', 'wheat-9', 'soybean-1'])).toBe('soybean')
    expect(mainCrop(['job-drilling', 'soil'])).toBeNull()
  })

  it('is searched under the codes that chapters are filed under', () => {
    expect(stageCode('wheat', '2')).toBe('wheat-2')
    expect(stageCode('wheat', 'soil')).toBe('soil')
  })
})

describe('the size of a field', () => {
  it('is converted by the international acre: 1 acre is 0.404 685 642 24 ha (NIST Handbook 44, appendix C)', () => {
    expect(hectaresOf(1)).toBeCloseTo(0.40468564224, 11)
    expect(acresOf(hectaresOf(64))).toBeCloseTo(64, 9)
  })

  it('is written with its unit', () => {
    expect(areaWords(64, 'us')).toBe('64 ac')
    expect(areaWords(64, 'metric')).toBe('25.9 ha')
    expect(areaWords(1.5, 'us')).toBe('1.5 ac')
  })
})
