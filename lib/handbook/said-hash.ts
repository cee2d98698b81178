import { createHash } from 'node:crypto'
import type { Claim } from '@/models/claim'
import type { Explainer } from '@/models/explainer'
import type { Term } from '@/models/term'

const hash = (said: unknown) => createHash('sha256').update(JSON.stringify(said)).digest('hex')

type SaidExplainer = Pick<Explainer, 'title' | 'summary' | 'body' | 'caution'>
type SaidClaim = Pick<Claim, 'key' | 'statement' | 'quantity' | 'low' | 'high' | 'unit' | 'sourceId' | 'locator'>
type SaidTerm = Pick<
  Term,
  | 'label'
  | 'definition'
  | 'field'
  | 'synonyms'
  | 'inflections'
  | 'regional'
  | 'context'
  | 'spanish'
  | 'agrovoc'
  | 'sourceNote'
>

/** jsonb gives the keys of an object back in an order of its own. */
const sorted = (value: object | null): unknown => value && Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1))

/** A fingerprint of what an explainer says, its claims with it. Verdicts are left out: a check changes nothing said. */
export function saidByExplainer(
  { title, summary, body, caution }: SaidExplainer,
  claims: readonly SaidClaim[],
): string {
  const said = [...claims].sort((a, b) => (a.key < b.key ? -1 : 1))
  return hash([
    [title, summary, body, caution],
    said.map((it) => [it.key, it.statement, it.quantity, it.low, it.high, it.unit, it.sourceId, it.locator]),
  ])
}

/** A fingerprint of what a term's entry says. */
export function saidByTerm(it: SaidTerm): string {
  const regional = it.regional.map(sorted)
  const rest = [it.synonyms, it.inflections, regional, sorted(it.context), it.spanish, it.agrovoc, it.sourceNote]
  return hash([it.label, it.definition, it.field, ...rest])
}
