import type { RegionalName } from '@/models/term'
import type { Basis, Verdict } from './entries'

/** The states of an explainer: nobody has begun, some claims held against a publication, all of them, checked too long ago. */
export type ExplainerState = 'draft' | 'in check' | 'checked' | 'due'

/** A term in a text: `from`/`to` are character offsets (UTF-16), `slug` the term. */
export type Mention = { from: number; to: number; slug: string }

/** How far an explainer was checked; `sources` counts the publications that its claims were held against. */
export type ExplainerNote = { slug: string; title: string; state: ExplainerState; sources: number }

/** What the ruled sheet of a term shows. */
export type TermNote = { slug: string; label: string; definition: string; explainer: ExplainerNote | null }

/** Notes by slug, as a page hands them to the text. */
export type TermNotes = Record<string, TermNote>

/** A place at which a term is said; `at` in seconds. */
export type HeardView = {
  episode: { id: string; number: number; title: string; slug: string; channel: { slug: string; name: string } }
  at: number
  text: string
  url: string
}

export type TermLine = TermNote & {
  field: string
  synonyms: string[]
  regional: RegionalName[]
  spanish: string | null
  agrovoc: string | null
  url: string
}

export type TermView = TermLine & { sourceNote: string | null; heard: HeardView[] }

export type SourceView = {
  key: string
  title: string
  authors: string[]
  publisher: string | null
  year: number | null
  url: string | null
}

export type ClaimView = {
  key: string
  statement: string
  quantity: string | null
  low: number | null
  high: number | null
  unit: string | null
  source: SourceView | null
  locator: string | null
  basis: Basis
  verdict: Verdict | null
  note: string | null
  checkedBy: string | null
  /** ISO date. */
  checkedOn: string | null
}

export type ExplainerLine = ExplainerNote & { summary: string; url: string }

export type ExplainerView = ExplainerLine & {
  edition: number
  /** Markdown; `{{claim:key}}` stands for a claim's figure. */
  body: string
  caution: string | null
  checkedOn: string | null
  claims: ClaimView[]
  bibliography: SourceView[]
  terms: { slug: string; label: string; url: string }[]
}

export const termUrl = (slug: string) => `/handbook/terms/${slug}`
export const explainerUrl = (slug: string) => `/handbook/explainers/${slug}`
