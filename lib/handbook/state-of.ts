import { now } from '@/lib/clock'
import type { Claim } from '@/models/claim'
import type { Explainer } from '@/models/explainer'
import { explainerState } from './rules'
import { saidByExplainer } from './said-hash'
import { explainerUrl, type ExplainerLine, type ExplainerNote } from './views'

export type LoadedExplainer = Explainer & { claims: Claim[] }

/** Today's state, not the stored one: a year passes and a text is changed without anybody setting it. */
export function explainerNote(row: LoadedExplainer): ExplainerNote {
  const changes = row.contentHash && row.contentHash !== saidByExplainer(row, row.claims) ? ['text'] : []
  const held = row.claims.filter(({ verdict }) => verdict !== null).flatMap(({ sourceId }) => sourceId ?? [])
  return {
    slug: row.slug,
    title: row.title,
    state: explainerState(row.claims, changes, row.checkedOn, now()),
    sources: new Set(held).size,
  }
}

export const explainerLine = (row: LoadedExplainer): ExplainerLine => ({
  ...explainerNote(row),
  summary: row.summary,
  url: explainerUrl(row.slug),
})
