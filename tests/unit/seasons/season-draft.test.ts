import { describe, expect, it } from 'vitest'
import { areaRead, draftAfter, draftOf, findingsOf, inputOf } from '@/components/season/editor/season-draft'
import type { SeasonView } from '@/lib/seasons/views'

const season: SeasonView = {
  id: 's',
  year: 2026,
  edition: 3,
  plantings: [
    {
      id: 'p',
      crop: 'maize',
      field: 'Church Bottom',
      areaAcres: 38.3,
      plantedOn: null,
      windows: [
        { stage: '0', startsOn: '2026-04-20', endsOn: '2026-05-02' },
        { stage: '1', startsOn: '2026-05-03', endsOn: '2026-06-06' },
      ],
    },
  ],
}
const opened = (units: 'us' | 'metric' = 'us') => draftOf(season, units)
const stageKey = opened()[0]?.windows[1]?.key ?? ''

describe('the form of a season', () => {
  it('gives back what it was opened on, to the last figure, in either unit', () => {
    for (const units of ['us', 'metric'] as const) {
      expect(inputOf(opened(units)).plantings[0]).toMatchObject({ areaAcres: 38.3, plantedOn: null })
    }
    expect(opened('metric')[0]?.area).toBe('15.5')
  })

  it('reads a decimal comma, and half a number as none', () => {
    expect(areaRead('38,5', 'us')).toBe(38.5)
    expect(areaRead('', 'us')).toBeNull()
    const draft = draftAfter(opened(), {
      move: 'change',
      key: 'p',
      to: { area: '38.x', areaAcres: areaRead('38.x', 'us') },
    })
    expect(findingsOf(draft, 2026)).toEqual([{ path: 'plantings.0.areaAcres', message: 'Give the area as a number' }])
  })

  it('offers the stage that follows, from the next day on, past the ones that are half written', () => {
    const half = draftAfter(opened(), { move: 'change-stage', key: 'p', stageKey, to: { endsOn: '' } })
    const draft = draftAfter(half, { move: 'add-stage', key: 'p', stageKey: 'new', year: 2026 })
    expect(draft[0]?.windows.at(-1)).toMatchObject({ stage: '1', startsOn: '2026-05-03' })
    const whole = draftAfter(opened(), { move: 'add-stage', key: 'p', stageKey: 'new', year: 2026 })
    expect(whole[0]?.windows.at(-1)).toEqual({ key: 'new', stage: '3', startsOn: '2026-06-07', endsOn: '2026-06-20' })
  })

  it('points at the field that keeps it from being saved', () => {
    const draft = draftAfter(opened(), { move: 'change-stage', key: 'p', stageKey, to: { endsOn: '' } })
    expect(findingsOf(draft, 2026).map(({ path }) => path)).toEqual(['plantings.0.windows.1.endsOn'])
    const named = draftAfter(opened(), { move: 'change', key: 'p', to: { field: '  ' } })
    expect(findingsOf(named, 2026)).toEqual([{ path: 'plantings.0.field', message: 'Name the field' }])
  })

  it('takes out the stage and the lane that were meant, and leaves the rest in its order', () => {
    const less = draftAfter(opened(), { move: 'remove-stage', key: 'p', stageKey })
    expect(less[0]?.windows.map(({ stage }) => stage)).toEqual(['0'])
    const more = draftAfter(draftAfter(opened(), { move: 'add', key: 'q' }), { move: 'remove', key: 'p' })
    expect(more.map(({ key }) => key)).toEqual(['q'])
  })
})
