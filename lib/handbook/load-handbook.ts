import type { Transaction } from 'sequelize'
import { inTransaction } from '@/lib/db'
import { enqueue } from '@/lib/jobs/queue'
import { refreshSearch } from '@/lib/search/jobs'
import '@/models/associations'
import { CaptionTrack } from '@/models/caption-track'
import { Claim } from '@/models/claim'
import { Explainer } from '@/models/explainer'
import { Source } from '@/models/source'
import { Term } from '@/models/term'
import { explainers as shippedExplainers } from './content/explainers'
import { sources as shippedSources } from './content/sources'
import { terms as shippedTerms } from './content/terms'
import type { ClaimEntry, ExplainerEntry, SourceEntry, TermEntry } from './entries'
import { hearTerms } from './jobs'
import { explainerState } from './rules'
import { saidByExplainer, saidByTerm } from './said-hash'
import type { LoadedExplainer } from './state-of'

export type ShippedHandbook = {
  sources: readonly SourceEntry[]
  explainers: readonly ExplainerEntry[]
  terms: readonly TermEntry[]
}

const shipped: ShippedHandbook = { sources: shippedSources, explainers: shippedExplainers, terms: shippedTerms }

/** Puts a source in, or renews it. Our own writes keep `updatedAt` where it was: a later one is a person's. */
async function loadSource(entry: SourceEntry): Promise<string> {
  const row = await Source.findOne({ where: { key: entry.key } })
  if (!row) return (await Source.create(entry)).id
  if (row.updatedAt.getTime() === row.createdAt.getTime()) await row.update(entry, { silent: true })
  return row.id
}

/** The day on which the last claim was settled; null while one is open. */
function settledOn(claims: readonly ClaimEntry[]): string | null {
  const days = claims.flatMap(({ verdict, checkedOn }) => (verdict === 'agrees' && checkedOn ? [checkedOn] : []))
  return days.length === claims.length ? (days.sort().at(-1) ?? null) : null
}

/** What a person changed or checked is theirs. */
const isTouched = (row: LoadedExplainer) =>
  row.contentHash !== saidByExplainer(row, row.claims) || row.claims.some(({ checkedBy }) => checkedBy !== null)

/** @returns the id of the explainer, and whether it was written */
async function loadExplainer(entry: ExplainerEntry, sourceIds: Map<string, string>) {
  const { claims: entries, ...words } = entry
  const claims = entries.map(({ source, ...claim }, position) => ({
    ...claim,
    sourceId: (source && sourceIds.get(source)) ?? null,
    position,
  }))
  const checkedOn = settledOn(entries)
  const state = explainerState(entries, [], checkedOn, new Date(checkedOn ?? 0))
  const values = { ...words, state, checkedOn, contentHash: saidByExplainer(words, claims) }
  const row = (await Explainer.findOne({ where: { slug: entry.slug }, include: ['claims'] })) as LoadedExplainer | null
  if (row && isTouched(row)) return { id: row.id, written: false }
  const written = row?.contentHash !== values.contentHash
  const explainer = row ?? (await Explainer.create(values))
  if (row && written) await row.update({ ...values, edition: row.edition + 1 })
  // Verdicts may be shipped anew without a word being changed; the rows are few and nobody else's.
  await Claim.destroy({ where: { explainerId: explainer.id } })
  await Claim.bulkCreate(claims.map((claim) => ({ ...claim, explainerId: explainer.id })))
  if (row && !written) await row.update({ state, checkedOn }, { silent: true })
  return { id: explainer.id, written }
}

/** @returns the id of the term when it was written */
async function loadTerm({ explainer, ...entry }: TermEntry, explainerIds: Map<string, string>): Promise<string | null> {
  const values = {
    ...entry,
    synonyms: [...entry.synonyms],
    inflections: [...entry.inflections],
    regional: [...entry.regional],
  }
  const contentHash = saidByTerm(values)
  const explainerId = (explainer && explainerIds.get(explainer)) ?? null
  const row = await Term.findOne({ where: { slug: entry.slug } })
  if (!row) return (await Term.create({ ...values, contentHash, explainerId })).id
  const isTheirs = row.contentHash !== saidByTerm(row)
  if (isTheirs || (row.contentHash === contentHash && row.explainerId === explainerId)) return null
  await row.update({ ...values, contentHash, explainerId })
  return row.id
}

/** Search looks at what was written, and what is heard where is found again. */
async function tellOthers(terms: string[], explainers: string[], transaction: Transaction): Promise<void> {
  for (const id of explainers) {
    await enqueue(refreshSearch, { kind: 'explainer', id }, { transaction, key: `explainer:${id}` })
  }
  for (const id of terms) await enqueue(refreshSearch, { kind: 'term', id }, { transaction, key: `term:${id}` })
  if (terms.length === 0) return
  const captioned = await CaptionTrack.findAll({ attributes: ['episodeId'], group: ['episodeId'] })
  for (const { episodeId } of captioned) await enqueue(hearTerms, { episodeId }, { transaction, key: episodeId })
}

/**
 * Brings the shipped handbook into the database: new entries are added, untouched ones renewed, and what a person
 * edited or checked is left alone. Running it again changes nothing. Needs the queues, so migrate first.
 * @returns how many terms and explainers were written
 */
export function loadHandbook(content: ShippedHandbook = shipped): Promise<{ terms: number; explainers: number }> {
  return inTransaction(async (transaction) => {
    const sourceIds = new Map<string, string>()
    for (const entry of content.sources) sourceIds.set(entry.key, await loadSource(entry))
    const explainerIds = new Map<string, string>()
    const written: string[] = []
    for (const entry of content.explainers) {
      const loaded = await loadExplainer(entry, sourceIds)
      explainerIds.set(entry.slug, loaded.id)
      if (loaded.written) written.push(loaded.id)
    }
    const terms: string[] = []
    for (const entry of content.terms) {
      const id = await loadTerm(entry, explainerIds)
      if (id) terms.push(id)
    }
    await tellOthers(terms, written, transaction)
    return { terms: terms.length, explainers: written.length }
  })
}
