import { describe, expect, it } from 'vitest'
import { asksSomething, isNarrowed, searchAsked, searchHref } from '@/lib/search/address-rules'

describe('the search in an address', () => {
  it('is read as the API reads it', () => {
    const { query, dropped } = searchAsked({ q: ' hoop ', crop: 'wheat', stage: '21', kind: '', job: 'drilling' })
    expect(query).toMatchObject({ q: 'hoop', crop: 'wheat', stage: 'wheat-21', job: 'job-drilling', limit: 20 })
    expect(query.kind).toBeUndefined()
    expect(dropped).toEqual([])
  })

  it('does what it can and names the choices that it left out', () => {
    const { query, dropped } = searchAsked({ q: 'hoop', crop: 'unicorn', stage: 'rice-31', season: '2026' })
    expect(query).toMatchObject({ q: 'hoop', season: '2026' })
    expect(query.crop).toBeUndefined()
    expect(dropped.sort()).toEqual(['crop', 'stage'])
  })

  it('passes over what is none of ours, what is given twice and the tail of an endless query', () => {
    const { query, dropped } = searchAsked({ utm_source: 'x', crop: ['wheat', 'rice'], q: 'w'.repeat(999), limit: '1' })
    expect(dropped).toEqual([])
    expect(query.q).toHaveLength(200)
    expect([query.crop, query.limit]).toEqual([undefined, 20])
  })
})

describe('the address of a search', () => {
  const { query } = searchAsked({ q: 'hoop & "soil"', crop: 'wheat', stage: 'wheat-2', kind: 'passage', cursor: 'abc' })

  it('leads back to the same search, from its top', () => {
    const again = Object.fromEntries(new URL(searchHref(query), 'http://x').searchParams)
    expect(searchAsked(again).query).toEqual({ ...query, cursor: undefined })
  })

  it('changes one thing and keeps the rest', () => {
    expect(searchHref(query, { kind: undefined })).toBe('/search?q=hoop+%26+%22soil%22&crop=wheat&stage=wheat-2')
    expect(searchHref(query, { cursor: 'next' })).toContain('&cursor=next')
    expect(searchHref(searchAsked({}).query)).toBe('/search')
  })

  it('tells a search that asks nothing from one that only chooses', () => {
    expect([asksSomething(searchAsked({}).query), isNarrowed(searchAsked({ q: 'x' }).query)]).toEqual([false, false])
    expect(asksSomething(searchAsked({ job: 'job-drilling' }).query)).toBe(true)
  })
})
