import type { StagePeriod, StoryPlanting } from './types'

/** Consecutive windows: each runs until the day before the next begins; the last one to `until`. */
function windows(starts: [stage: string, from: string][], until: string): StagePeriod[] {
  return starts.map(([stage, from], index) => ({ stage, from, to: dayBefore(starts[index + 1]?.[1]) ?? until }))
}

function dayBefore(day: string | undefined): string | null {
  if (!day) return null
  return new Date(Date.parse(`${day}T00:00:00Z`) - 86_400_000).toISOString().slice(0, 10)
}

const alder = { channel: 'alder-fork' } as const

/** Lanes of the season boards. Windows are set by hand, as a channel without a weather file does it. */
export const plantings: StoryPlanting[] = [
  {
    ...alder,
    season: '2025',
    crop: 'maize',
    field: 'Long Field',
    acres: 64,
    plantedOn: '2025-04-24',
    periods: windows(
      [
        ['soil', '2025-03-20'],
        ['0', '2025-04-24'],
        ['1', '2025-05-06'],
        ['3', '2025-06-10'],
        ['5', '2025-07-12'],
        ['6', '2025-07-24'],
        ['7', '2025-08-06'],
        ['8', '2025-08-28'],
        ['9', '2025-09-08'],
      ],
      '2025-09-18',
    ),
  },
  {
    ...alder,
    season: '2025',
    crop: 'wheat',
    field: 'Long Field',
    acres: 64,
    plantedOn: '2025-10-06',
    periods: windows(
      [
        ['soil', '2025-09-19'],
        ['0', '2025-10-06'],
        ['1', '2025-10-17'],
        ['2', '2025-11-10'],
      ],
      '2025-12-31',
    ),
  },
  {
    ...alder,
    season: '2026',
    crop: 'wheat',
    field: 'Long Field',
    acres: 64,
    plantedOn: '2025-10-06',
    periods: windows(
      [
        ['2', '2026-01-01'],
        ['3', '2026-03-29'],
        ['4', '2026-04-26'],
        ['5', '2026-05-05'],
        ['6', '2026-05-14'],
        ['7', '2026-05-23'],
        ['8', '2026-06-14'],
        ['9', '2026-07-04'],
      ],
      '2026-07-25',
    ),
  },
  {
    ...alder,
    season: '2026',
    crop: 'soybean',
    field: 'River Piece',
    acres: 41,
    plantedOn: '2026-05-09',
    periods: windows(
      [
        ['soil', '2026-03-21'],
        ['0', '2026-05-09'],
        ['1', '2026-05-22'],
        ['2', '2026-06-11'],
        ['6', '2026-06-30'],
        ['7', '2026-07-31'],
        ['8', '2026-09-06'],
        ['9', '2026-10-05'],
      ],
      '2026-10-24',
    ),
  },
  {
    ...alder,
    season: '2026',
    crop: 'wheat',
    field: 'River Piece',
    acres: 41,
    plantedOn: '2026-10-28',
    periods: windows(
      [
        ['soil', '2026-10-25'],
        ['0', '2026-10-28'],
        ['1', '2026-11-12'],
      ],
      '2026-12-31',
    ),
  },
  {
    ...alder,
    season: '2026',
    crop: 'maize',
    field: 'Church Bottom',
    acres: 38,
    plantedOn: '2026-04-20',
    periods: windows(
      [
        ['soil', '2026-03-14'],
        ['0', '2026-04-20'],
        ['1', '2026-05-03'],
        ['3', '2026-06-07'],
        ['5', '2026-07-09'],
        ['6', '2026-07-22'],
        ['7', '2026-08-05'],
        ['8', '2026-09-09'],
        ['9', '2026-10-09'],
      ],
      '2026-11-01',
    ),
  },
  {
    channel: 'terrace-nine',
    season: '2026',
    crop: 'rice',
    field: 'Terraces one to nine',
    acres: 11,
    plantedOn: '2026-04-30',
    periods: windows(
      [
        ['soil', '2026-04-01'],
        ['0', '2026-04-30'],
        ['1', '2026-05-09'],
        ['2', '2026-05-29'],
        ['3', '2026-07-04'],
        ['4', '2026-07-15'],
        ['5', '2026-07-26'],
        ['6', '2026-08-03'],
        ['7', '2026-08-13'],
        ['8', '2026-08-30'],
        ['9', '2026-09-22'],
      ],
      '2026-10-15',
    ),
  },
]
