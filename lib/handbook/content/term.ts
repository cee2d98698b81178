import type { TermEntry } from '../entries'

type Written = Pick<TermEntry, 'slug' | 'label' | 'definition' | 'sourceNote'> &
  Partial<Pick<TermEntry, 'synonyms' | 'inflections' | 'regional' | 'context' | 'spanish' | 'agrovoc' | 'explainer'>>

/** Entries of one field of work; what an entry does not say is empty. */
export function termsOf(field: TermEntry['field'], entries: Written[]): TermEntry[] {
  return entries.map((entry) => ({
    synonyms: [],
    inflections: [],
    regional: [],
    context: null,
    spanish: null,
    agrovoc: null,
    explainer: null,
    ...entry,
    field,
  }))
}

/** Which publication an adviser should open for a definition; nobody has yet, and the page says so. */
export const notYetHeldAgainst = (publication: string) => `Not yet held against ${publication}.`

export const sssa = notYetHeldAgainst('the SSSA Glossary of Soil Science Terms')
export const s414 = notYetHeldAgainst('ASABE S414, tillage terms')
export const nrcs = notYetHeldAgainst('the NRCS National Engineering Handbook and practice standards')
export const bbch = notYetHeldAgainst('the BBCH Monograph (Meier 2001)')
export const asabe = (standard: string) => notYetHeldAgainst(`ASABE ${standard}`)
