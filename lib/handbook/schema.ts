import { z } from 'zod'
import { pageOf, pageQuery } from '@/lib/http/paging'

export const slugParams = z.object({ slug: z.string().min(1).max(80) })

/** A handbook is read whole: a page holds as many entries as a list may. */
export const entriesQuery = pageQuery.extend({ limit: z.coerce.number().int().min(1).max(100).default(100) })
export type EntriesQuery = z.infer<typeof entriesQuery>

const explainerState = z.enum(['draft', 'in check', 'checked', 'due'])
const explainerNote = z.object({
  slug: z.string(),
  title: z.string(),
  state: explainerState,
  sources: z.number().int(),
})

const termNote = z.object({
  slug: z.string(),
  label: z.string(),
  definition: z.string(),
  explainer: explainerNote.nullable(),
})

const termLine = termNote.extend({
  field: z.string(),
  synonyms: z.array(z.string()),
  regional: z.array(z.object({ place: z.string(), name: z.string() })),
  spanish: z.string().nullable(),
  agrovoc: z.string().nullable(),
  url: z.string(),
})

const heard = z.object({
  episode: z.object({
    id: z.string(),
    number: z.number(),
    title: z.string(),
    slug: z.string(),
    channel: z.object({ slug: z.string(), name: z.string() }),
  }),
  at: z.number().describe('seconds'),
  text: z.string(),
  url: z.string(),
})

const source = z.object({
  key: z.string(),
  title: z.string(),
  authors: z.array(z.string()),
  publisher: z.string().nullable(),
  year: z.number().nullable(),
  url: z.string().nullable(),
})

const claim = z.object({
  key: z.string(),
  statement: z.string(),
  quantity: z.string().nullable(),
  low: z.number().nullable(),
  high: z.number().nullable(),
  unit: z.string().nullable(),
  source: source.nullable(),
  locator: z.string().nullable(),
  basis: z.string().describe('how the figure came into the handbook'),
  verdict: z.enum(['agrees', 'differs', 'not found']).nullable().describe('null until held against the source'),
  note: z.string().nullable(),
  checkedBy: z.string().nullable(),
  checkedOn: z.iso.date().nullable(),
})

const explainerLine = explainerNote.extend({ summary: z.string(), url: z.string() })

export const termsOutput = pageOf(termLine)
export const termOutput = termLine.extend({ sourceNote: z.string().nullable(), heard: z.array(heard) })
export const explainersOutput = pageOf(explainerLine)
export const explainerOutput = explainerLine.extend({
  edition: z.number().int(),
  body: z.string().describe('Markdown; {{claim:key}} stands for the figure of a claim'),
  caution: z.string().nullable(),
  checkedOn: z.iso.date().nullable(),
  claims: z.array(claim),
  bibliography: z.array(source),
  terms: z.array(z.object({ slug: z.string(), label: z.string(), url: z.string() })),
})
