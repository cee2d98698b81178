import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dayAt, lanesOf, middleOf, placed, shapeOf } from '@/components/season/board-geometry'
import { addDays } from '@/lib/dates/rules'
import type { FilmedEpisode, PlantingView, SeasonView } from '@/lib/seasons/views'

const year = { from: '2026-01-01', to: '2026-12-31' }
const leap = { from: '2024-01-01', to: '2024-12-31' }
const film = (number: number, filmedOn: string, crop: FilmedEpisode['crop'] = 'wheat'): FilmedEpisode => ({
  number,
  title: `Episode ${number}`,
  url: `/channels/a/episodes/e${number}`,
  filmedOn,
  crop,
})

describe('a day on the board', () => {
  it('begins at the left edge on the first day and ends at the right edge on the last', () => {
    expect(dayAt(year, '2026-01-01')).toBe(0)
    expect(shapeOf(year, { startsOn: '2026-01-01', endsOn: '2026-12-31' })).toEqual({ left: 0, width: 100 })
  })

  it('is one 365th of a year, one 366th of a leap year', () => {
    expect(shapeOf(year, { startsOn: '2026-07-01', endsOn: '2026-07-01' })?.width).toBeCloseTo(100 / 365, 9)
    expect(shapeOf(leap, { startsOn: '2024-02-29', endsOn: '2024-02-29' })?.width).toBeCloseTo(100 / 366, 9)
  })

  it('is as wide in the week the clocks change as in any other', () => {
    const week = (startsOn: string) => shapeOf(year, { startsOn, endsOn: addDays(startsOn, 6) })?.width
    expect(week('2026-03-05')).toBeCloseTo(week('2026-06-04') ?? 0, 9)
    expect(week('2026-10-29')).toBeCloseTo(week('2026-06-04') ?? 0, 9)
  })
})

describe('a stage on the board', () => {
  it('touches the one that begins on the next day', () => {
    const first = shapeOf(year, { startsOn: '2026-03-29', endsOn: '2026-04-25' })
    const second = shapeOf(year, { startsOn: '2026-04-26', endsOn: '2026-05-04' })
    expect((first?.left ?? 0) + (first?.width ?? 0)).toBeCloseTo(second?.left ?? -1, 9)
  })

  it('leaves a gap of as many days as lie between', () => {
    const first = shapeOf(year, { startsOn: '2026-03-01', endsOn: '2026-03-10' })
    const second = shapeOf(year, { startsOn: '2026-03-21', endsOn: '2026-03-31' })
    expect((second?.left ?? 0) - (first?.left ?? 0) - (first?.width ?? 0)).toBeCloseTo((10 / 365) * 100, 9)
  })

  it('is cut at the year end, and not drawn when it lies beyond', () => {
    expect(shapeOf(year, { startsOn: '2025-11-10', endsOn: '2026-01-01' })).toEqual({ left: 0, width: 100 / 365 })
    expect(shapeOf(year, { startsOn: '2026-12-31', endsOn: '2027-02-01' })?.width).toBeCloseTo(100 / 365, 9)
    expect(shapeOf(year, { startsOn: '2025-11-10', endsOn: '2025-12-31' })).toBeNull()
    expect(shapeOf(year, { startsOn: '2027-01-01', endsOn: '2027-01-02' })).toBeNull()
  })

  it('never leaves the board, whatever its days', () => {
    const day = fc.integer({ min: -800, max: 800 }).map((days) => addDays('2026-06-01', days))
    fc.assert(
      fc.property(day, fc.nat(500), (startsOn, length) => {
        const shape = shapeOf(year, { startsOn, endsOn: addDays(startsOn, length) })
        return !shape || (shape.left >= 0 && shape.width > 0 && shape.left + shape.width <= 100 + 1e-9)
      }),
    )
  })
})

describe('markers', () => {
  it('stand in the middle of their day', () => {
    expect(placed(year, [film(1, '2026-01-01')])[0]?.at).toBeCloseTo(50 / 365, 9)
    expect(middleOf(year, '2026-12-31')).toBeCloseTo(100 - 50 / 365, 9)
  })

  it('of one week stand above each other, and those apart on one level', () => {
    const levels = placed(year, [
      film(3, '2026-03-20'),
      film(1, '2026-03-18'),
      film(2, '2026-03-18'),
      film(4, '2026-05-01'),
    ])
    expect(levels.map(({ episode, level }) => [episode.number, level])).toEqual([
      [1, 0],
      [2, 1],
      [3, 2],
      [4, 0],
    ])
  })
})

describe('the lane of an episode', () => {
  const planting = (id: string, crop: PlantingView['crop'], startsOn: string, endsOn: string): PlantingView => ({
    id,
    crop,
    field: id,
    areaAcres: null,
    plantedOn: null,
    windows: [{ stage: '2', startsOn, endsOn }],
  })
  const season: SeasonView = {
    id: 's',
    year: 2026,
    edition: 1,
    plantings: [
      planting('spring', 'wheat', '2026-01-01', '2026-06-30'),
      planting('autumn', 'wheat', '2026-10-01', '2026-12-31'),
      planting('beans', 'soybean', '2026-05-01', '2026-09-30'),
    ],
  }

  it('is the field of its crop that stood in a stage on that day', () => {
    const { lanes } = lanesOf(season, [film(1, '2026-03-18'), film(2, '2026-11-02'), film(3, '2026-06-01', 'soybean')])
    expect(lanes.map(({ episodes }) => episodes.map(({ number }) => number))).toEqual([[1], [2], [3]])
  })

  it('is the first of its crop between two stages, and none for another crop or no crop: nothing is lost', () => {
    const { lanes, rest } = lanesOf(season, [
      film(1, '2026-08-18'),
      film(2, '2026-03-01', 'rice'),
      film(3, '2026-03-02', null),
    ])
    expect(lanes[0]?.episodes.map(({ number }) => number)).toEqual([1])
    expect(rest.map(({ number }) => number)).toEqual([2, 3])
  })
})
