import type { Claim } from '@/models/claim'
import type { Source } from '@/models/source'
import type { Basis } from './entries'
import type { ClaimView, SourceView } from './views'

export const sourceView = ({ key, title, authors, publisher, year, url }: Source): SourceView => ({
  key,
  title,
  authors,
  publisher,
  year,
  url,
})

export const claimView = (row: Claim & { source: Source | null }): ClaimView => ({
  key: row.key,
  statement: row.statement,
  quantity: row.quantity,
  low: row.low,
  high: row.high,
  unit: row.unit,
  source: row.source && sourceView(row.source),
  locator: row.locator,
  basis: row.basis as Basis,
  verdict: row.verdict,
  note: row.note,
  checkedBy: row.checkedByName,
  checkedOn: row.checkedOn,
})
