import { describe, expect, it } from 'vitest'
import { explainers } from '@/lib/handbook/content/explainers'
import { sources } from '@/lib/handbook/content/sources'
import { terms } from '@/lib/handbook/content/terms'
import { claimKeys, explainerState } from '@/lib/handbook/rules'

const keys = (things: { key: string }[]) => things.map(({ key }) => key)
const claimOf = (explainer: string, key: string) =>
  explainers.find(({ slug }) => slug === explainer)?.claims.find((claim) => claim.key === key)

describe.each(explainers)('the explainer $slug', (explainer) => {
  it('takes every figure from a claim: no digit stands in its text', () => {
    const prose = explainer.body.replace(/\{\{claim:[a-z0-9-]+\}\}/g, '').replace(/^\d+\. /gm, '')
    expect(prose.match(/\d/g)).toBeNull()
  })

  it('names only claims that exist and carry a figure', () => {
    const figured = explainer.claims.filter(({ low }) => low !== null)
    expect(claimKeys(explainer.body).filter((key) => !keys(figured).includes(key))).toEqual([])
  })

  it('leaves no figure unused and no claim key double', () => {
    const unused = explainer.claims.filter(({ key, low }) => low !== null && !claimKeys(explainer.body).includes(key))
    expect(keys(unused)).toEqual([])
    expect(new Set(keys(explainer.claims)).size).toBe(explainer.claims.length)
  })

  it('is 300 to 600 words long and holds no raw HTML', () => {
    const words = explainer.body.split(/\s+/).length
    expect(words).toBeGreaterThanOrEqual(300)
    expect(words).toBeLessThanOrEqual(650)
    expect(explainer.body).not.toMatch(/<[a-z!/]/i)
  })

  it('calls nothing checked that was not read in the publication itself', () => {
    for (const claim of explainer.claims) {
      if (claim.basis === 'publication opened') {
        expect(claim).toMatchObject({ verdict: 'agrees', source: expect.any(String), locator: expect.any(String) })
        expect(claim.checkedOn).toMatch(/^\d{4}-\d\d-\d\d$/)
        expect(claim.checkedByName).not.toBeNull()
      } else expect(claim).toMatchObject({ verdict: null, checkedOn: null, checkedByName: null })
    }
  })

  it('cites publications that are listed', () => {
    const cited = explainer.claims.flatMap(({ source }) => source ?? [])
    expect(cited.filter((key) => !keys(sources).includes(key))).toEqual([])
  })
})

describe('the handbook as shipped', () => {
  it('has at least 25 terms with their own slugs, each with a definition that ends as a sentence', () => {
    expect(terms.length).toBeGreaterThanOrEqual(25)
    expect(new Set(terms.map(({ slug }) => slug)).size).toBe(terms.length)
    for (const { definition } of terms) expect(definition).toMatch(/^[A-Z].*\.$/)
  })

  it('leads terms only to explainers that exist', () => {
    const slugs = explainers.map(({ slug }) => slug)
    expect(terms.flatMap(({ explainer }) => explainer ?? []).filter((slug) => !slugs.includes(slug))).toEqual([])
  })

  it('gives AGROVOC ids only as seen in published vocabulary lists', () => {
    // Ids seen second-hand in metadata of Rothamsted Research; every other term goes without.
    const seen = { tillage: 'c_7771', 'green-manure': 'c_3375', irrigation: 'c_3954', maize: 'c_12332' }
    const given = terms.filter(({ agrovoc }) => agrovoc).map(({ slug, agrovoc }) => [slug, agrovoc])
    expect(Object.fromEntries(given)).toEqual(seen)
  })

  it('lists no source twice, and each as CSL-JSON under its key', () => {
    expect(new Set(keys(sources)).size).toBe(sources.length)
    for (const { key, title, csl } of sources) expect(csl).toMatchObject({ id: key, title, type: expect.any(String) })
  })

  it('starts with the explainers that lean on remembered figures still in check', () => {
    const states = explainers.map(({ slug, claims }) => [
      slug,
      explainerState(claims, [], claims.every(({ verdict }) => verdict) ? '2026-12-01' : null, new Date('2026-12-02')),
    ])
    expect(Object.fromEntries(states)).toEqual({
      'ground-fit-to-work': 'in check',
      'counting-a-stand': 'checked',
      'heat-units': 'checked',
      shrink: 'checked',
    })
  })
})

describe('figures of the explainers against the published arithmetic', () => {
  const round = (value: number, digits: number) => Number(value.toFixed(digits))
  const gdd = (high: number, low: number) =>
    (Math.min(Math.max(high, 50), 86) + Math.min(Math.max(low, 50), 86)) / 2 - 50

  it.each([
    // SDSU Extension (Karki 2019): 1 − (100 − 25)/(100 − 15.5).
    ['shrink', 'example-shrink', round(100 * (1 - 75 / 84.5), 2)],
    // SDSU Extension (Dillivan 2014), table 1: 100/(100 − final moisture).
    ['shrink', 'factor-market', round(100 / 84.5, 3)],
    ['shrink', 'factor-fifteen', round(100 / 85, 3)],
    // National Corn Handbook NCH-61 (Hicks and Cloud): 100/88.
    ['shrink', 'factor-twelve', round(100 / 88, 3)],
    // Penn State Extension, Wheat Stand Assessment: 40 × 4 / 7.
    ['counting-a-stand', 'row-stand', round((40 * 4) / 7, 0)],
    // 360 Ag Consulting (Potter 2015), wheat example 1: 30 × 38 / (0.94 × 10).
    ['counting-a-stand', 'rate', round((30 * 38) / (0.94 * 10), 0)],
    // Purdue (Nielsen), example 1, modified 86/50 method.
    ['heat-units', 'example-day', gdd(80, 55)],
    // Waushara Argus 2018: three days, nights below 50 °F lifted to it.
    ['heat-units', 'three-days', gdd(90, 65) + gdd(72, 46) + gdd(63, 42)],
    // Ohio State C.O.R.N. 2018-15 after Nielsen 2014: (785 − 120)/82.
    ['heat-units', 'worked-leaves', round((785 - 120) / 82, 1)],
  ])('%s, %s is %d', (explainer, key, expected) => {
    expect(claimOf(explainer, key)).toMatchObject({ low: expected, high: expected })
  })
})
