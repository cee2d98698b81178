import type { RegionalName, TermContext } from '@/models/term'

/** The heads that terms are listed under. */
export const workFields = [
  'Tillage and soil',
  'Water',
  'Planting and growth',
  'Machinery and shop',
  'Harvest and storage',
] as const

export type WorkField = (typeof workFields)[number]

/** What marking a text needs to know of a term. */
export type TermForms = {
  slug: string
  label: string
  synonyms: readonly string[]
  inflections: readonly string[]
  regional: readonly RegionalName[]
  context: TermContext | null
}

/** A glossary entry as content: definitions are ours, `agrovoc` only where it was seen in a published vocabulary list. */
export type TermEntry = TermForms & {
  definition: string
  field: WorkField
  spanish: string | null
  agrovoc: string | null
  /** Where an adviser should hold the definition against, and that nobody has yet. */
  sourceNote: string
  explainer: string | null
}

/** How a figure came into the handbook. Only the first was read in the publication itself. */
export type Basis = 'publication opened' | 'as transcribed elsewhere' | 'worked out' | 'from memory' | 'common practice'

export type Verdict = 'agrees' | 'differs' | 'not found'

/** A checkable statement. `{{claim:key}}` in the body stands for its figure, so that the figure exists once. */
export type ClaimEntry = {
  key: string
  statement: string
  quantity: string | null
  low: number | null
  high: number | null
  unit: string | null
  source: string | null
  locator: string | null
  basis: Basis
  /** Null until somebody held the claim against the source. */
  verdict: Verdict | null
  note: string | null
  checkedByName: string | null
  /** ISO date. */
  checkedOn: string | null
}

export type ExplainerEntry = {
  slug: string
  title: string
  summary: string
  /** Markdown with claim tokens, no raw HTML. */
  body: string
  /** Stands at the head where the work can hurt. */
  caution: string | null
  claims: ClaimEntry[]
}

/** A publication; `csl` holds CSL-JSON fields. */
export type SourceEntry = {
  key: string
  title: string
  authors: string[]
  publisher: string | null
  year: number | null
  url: string | null
  csl: Record<string, unknown>
}
