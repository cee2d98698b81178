import { describe, expect, it } from 'vitest'
import { cropChoices, plainChoices, stageChoices, topicChoices } from '@/lib/search/choice-rules'
import type { SearchResult } from '@/lib/search/schema'

const facets: SearchResult['facets'] = {
  kind: {},
  channel: {},
  crop: { wheat: 3 },
  stage: { soil: 2, 'wheat-2': 3, 'wheat-21': 1, 'rice-7': 1 },
  job: { 'job-drilling': 2 },
  subject: {},
  season: { 2025: 1, 2026: 4 },
}

describe('choices', () => {
  it('are those that something is filed under, with how many', () => {
    expect(cropChoices(facets)).toEqual([{ value: 'wheat', label: 'Wheat (3)' }])
    expect(topicChoices('job', facets)).toEqual([{ value: 'job-drilling', label: 'Drilling (2)' }])
    expect(topicChoices('subject', facets)).toEqual([])
    expect(plainChoices(facets.season, undefined)).toHaveLength(2)
  })

  it('keep the one that is made, though nothing has it', () => {
    expect(cropChoices(facets, 'rice').map(({ value }) => value)).toEqual(['wheat', 'rice'])
    expect(plainChoices({}, 'alder', () => 'Alder Fork Farm')).toEqual([{ value: 'alder', label: 'Alder Fork Farm' }])
  })

  it('are the whole vocabulary, uncounted, while nothing can be counted', () => {
    expect(cropChoices(null)).toHaveLength(7)
    expect(cropChoices(null)[0]).toEqual({ value: 'wheat', label: 'Wheat' })
    expect(topicChoices('job', null).length).toBeGreaterThan(10)
  })
})

describe('stages', () => {
  it('are the principal ones crop by crop, the seedbed before them', () => {
    expect(stageChoices(facets, {})).toEqual([
      { value: 'soil', label: 'Seedbed (2)' },
      { label: 'Wheat', options: [{ value: 'wheat-2', label: 'Tillering (3)' }] },
      { label: 'Rice', options: [{ value: 'rice-7', label: 'Grain fill (1)' }] },
    ])
  })

  it('of a chosen crop come with their two-digit codes, and no other crop with them', () => {
    const [, wheat, ...others] = stageChoices(facets, { crop: 'wheat' })
    expect(others).toEqual([])
    const values = wheat && 'options' in wheat ? wheat.options.map(({ value }) => value) : []
    expect(values).toEqual(['wheat-2', 'wheat-21'])
  })

  it('chosen by a two-digit code stay in the list', () => {
    expect(JSON.stringify(stageChoices(facets, { stage: 'maize-65' }))).toContain('maize-65')
  })
})
