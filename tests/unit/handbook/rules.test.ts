import { describe, expect, it } from 'vitest'
import {
  byLetter,
  checkWords,
  claimWords,
  cutAtMentions,
  explainerState,
  figure,
  weaveClaims,
} from '@/lib/handbook/rules'

const agrees = { verdict: 'agrees' } as const
const open = { verdict: null } as const
const now = new Date('2026-12-01T10:00:00Z')

describe('the state of an explainer', () => {
  it.each([
    ['draft while nobody has held a claim against a source', [open, open], [], null, 'draft'],
    ['draft without any claims', [], [], null, 'draft'],
    ['in check while some claims are open', [agrees, open], [], null, 'in check'],
    ['in check while one differs', [agrees, { verdict: 'differs' }], [], null, 'in check'],
    ['in check while one is not found, date or not', [{ verdict: 'not found' }], [], '2026-11-01', 'in check'],
    ['checked when all agree', [agrees, agrees], [], '2026-11-01', 'checked'],
    ['checked on the last day of the year', [agrees], [], '2025-12-02', 'checked'],
    ['due on the day a year later', [agrees], [], '2025-12-01', 'due'],
    ['due when something changed since', [agrees], ['rate'], '2026-11-30', 'due'],
    ['due when a claim was emptied after the check', [agrees, open], ['rate'], '2026-11-30', 'due'],
  ] as const)('is %s', (_, claims, changes, checkedOn, expected) => {
    expect(explainerState(claims, changes, checkedOn, now)).toBe(expected)
  })

  it('holds a check made on 29 February until 1 March', () => {
    const stateOn = (day: string) => explainerState([agrees], [], '2028-02-29', new Date(day))
    expect(stateOn('2029-02-28T23:59:59Z')).toBe('checked')
    expect(stateOn('2029-03-01T00:00:00Z')).toBe('due')
  })

  it('is said in words that never claim more than was checked', () => {
    expect(checkWords({ state: 'checked', sources: 2 })).toBe('Checked against 2 publications')
    expect(checkWords({ state: 'checked', sources: 1 })).toBe('Checked against 1 publication')
    expect(checkWords({ state: 'in check', sources: 3 })).toBe('Being checked, so far against 3 publications')
    expect(checkWords({ state: 'in check', sources: 0 })).toBe('Not checked yet')
    expect(checkWords({ state: 'draft', sources: 0 })).toBe('Not checked yet')
    expect(checkWords({ state: 'due', sources: 2 })).toBe('Due to be checked again')
  })
})

describe('a claim’s figure', () => {
  it.each([
    [{ low: 100, high: 120, unit: 'GDD (°F)' }, '100–120\u00a0GDD (°F)'],
    [{ low: 11.24, high: 11.24, unit: '%' }, '11.24\u00a0%'],
    [{ low: 27154.29, high: null, unit: 'gal' }, '27,154.29\u00a0gal'],
    [{ low: null, high: 10, unit: 'short tons' }, '10\u00a0short tons'],
    [{ low: 0.9, high: 0.9, unit: null }, '0.9'],
    [{ low: 0, high: 0, unit: '%' }, '0\u00a0%'],
    [{ low: -3, high: 2, unit: '°C' }, '-3–2\u00a0°C'],
  ])('%o reads %s', (claim, expected) => expect(figure(claim)).toBe(expected))

  it('is null where there is none', () => expect(figure({ low: null, high: null, unit: '%' })).toBeNull())
})

describe('weaving claims into a text', () => {
  const claims = [
    { key: 'rate', low: 121, high: 121, unit: 'lb/ac' },
    { key: 'odd', low: 1, high: 1, unit: 'a*b_[c]<i>' },
    { key: 'words', low: null, high: null, unit: null },
  ]

  it('sets the figure as a link to the claim’s row, as often as it is named', () => {
    expect(weaveClaims('Sow {{claim:rate}}, yes {{claim:rate}}.', claims)).toBe(
      'Sow [121\u00a0lb/ac](#claim-rate), yes [121\u00a0lb/ac](#claim-rate).',
    )
  })

  it('lets no unit become Markdown or HTML', () => {
    expect(weaveClaims('{{claim:odd}}', claims)).toBe('[1\u00a0a\\*b\\_\\[c\\]\\<i\\>](#claim-odd)')
  })

  it('shows a gap for a claim that is missing or has no figure, and leaves other braces alone', () => {
    expect(weaveClaims('{{claim:gone}} {{claim:words}} {{claim:UP}} {{rate}}', claims)).toBe(
      '(figure missing) (figure missing) {{claim:UP}} {{rate}}',
    )
  })
})

describe('cutting a text at its terms', () => {
  it('gives the pieces in order and the whole text back', () => {
    const text = 'Walk past the headland, count the stand.'
    const pieces = cutAtMentions(text, [
      { from: 34, to: 39, slug: 'stand' },
      { from: 14, to: 22, slug: 'headland' },
    ])
    expect(pieces.map((piece) => piece.slug)).toEqual([null, 'headland', null, 'stand', null])
    expect(pieces.map((piece) => piece.text).join('')).toBe(text)
  })

  it('drops what overlaps, is empty or lies outside', () => {
    const pieces = cutAtMentions('crown', [
      { from: 0, to: 5, slug: 'crown' },
      { from: 2, to: 4, slug: 'row' },
      { from: 5, to: 5, slug: 'none' },
      { from: 3, to: 9, slug: 'far' },
    ])
    expect(pieces).toEqual([{ from: 0, text: 'crown', slug: 'crown' }])
    expect(cutAtMentions('', [{ from: 0, to: 1, slug: 'x' }])).toEqual([])
  })
})

describe('what is said of a claim', () => {
  it('is the verdict once there is one, before that how the figure came here', () => {
    expect(claimWords({ verdict: 'differs', basis: 'publication opened' })).toBe('Differs from the publication')
    expect(claimWords({ verdict: null, basis: 'worked out' })).toBe('Worked out from the published formula')
    expect(claimWords({ verdict: null, basis: 'from memory' })).toBe('From memory; no publication opened yet')
  })
})

describe('the glossary by letters', () => {
  it('keeps case and accents under one letter, in the order of a dictionary', () => {
    const labels = ['ROPS', 'crust', 'épi', 'emergence', 'Crown']
    const letters = byLetter(labels.map((label) => ({ label })))
    expect(letters.map(({ letter, terms }) => [letter, terms.map(({ label }) => label)])).toEqual([
      ['C', ['Crown', 'crust']],
      ['E', ['emergence', 'épi']],
      ['R', ['ROPS']],
    ])
  })
})
