import type { ClaimEntry } from '../entries'

type Said = Pick<ClaimEntry, 'key' | 'statement'> &
  Partial<Pick<ClaimEntry, 'quantity' | 'low' | 'high' | 'unit' | 'locator' | 'note'>>

const blank = { quantity: null, low: null, high: null, unit: null, locator: null, note: null }

/** A figure that is one number. */
export const value = (value: number, unit: string | null = null) => ({ low: value, high: value, unit })

/** A figure that is a range. */
export const range = (low: number, high: number, unit: string) => ({ low, high, unit })

/** The day on which the publications were opened and the claims of this folder held against them. */
const openedOn = '2026-12-01'

/** Read in the publication itself, and it agrees. */
export const opened = (source: string, said: Said): ClaimEntry => ({
  ...blank,
  ...said,
  source,
  basis: 'publication opened',
  verdict: 'agrees',
  checkedByName: 'the handbook’s editors',
  checkedOn: openedOn,
})

/** Seen in somebody else's account of the publication: waits for an adviser who opens it. */
export const transcribed = (source: string, said: Said): ClaimEntry =>
  unchecked('as transcribed elsewhere', source, said)

/** Nobody has opened a publication for it yet. `source` is where to look. */
export const remembered = (source: string | null, said: Said): ClaimEntry => unchecked('from memory', source, said)

function unchecked(basis: ClaimEntry['basis'], source: string | null, said: Said): ClaimEntry {
  return { ...blank, ...said, source, basis, verdict: null, checkedByName: null, checkedOn: null }
}
