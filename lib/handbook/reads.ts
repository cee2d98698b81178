import { Op, type WhereOptions } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { visibleTo } from '@/lib/episodes/reads'
import { episodeUrl, inSeconds } from '@/lib/episodes/views'
import { notFound } from '@/lib/errors'
import { cutPage, decodeCursor, type Page } from '@/lib/http/paging'
import '@/models/associations'
import type { Channel } from '@/models/channel'
import type { Episode } from '@/models/episode'
import { Explainer } from '@/models/explainer'
import { Hearing } from '@/models/hearing'
import type { Source } from '@/models/source'
import { Term } from '@/models/term'
import { claimView, sourceView } from './claim-views'
import type { EntriesQuery } from './schema'
import { type LoadedTerm, termNote, WITH_EXPLAINER } from './spoken-terms'
import { explainerLine, type LoadedExplainer } from './state-of'
import { type ExplainerLine, type ExplainerView, type HeardView, type TermLine, termUrl, type TermView } from './views'

/** Rows after the one that the cursor names, in the order of `column` and slug. */
function after(cursor: string | undefined, column: 'label' | 'title'): WhereOptions {
  if (!cursor) return {}
  const [name = '', slug = ''] = decodeCursor(cursor, 2).map(String)
  return { [Op.or]: [{ [column]: { [Op.gt]: name } }, { [column]: name, slug: { [Op.gt]: slug } }] }
}

const termLine = (row: LoadedTerm): TermLine => ({
  ...termNote(row),
  field: row.field,
  synonyms: row.synonyms,
  regional: row.regional.map(({ place, name }) => ({ place, name })),
  spanish: row.spanish,
  agrovoc: row.agrovoc,
  url: termUrl(row.slug),
})

/** The glossary from A to Z. */
export async function listTerms({ cursor, limit }: EntriesQuery): Promise<Page<TermLine>> {
  const order: [string, string][] = [
    ['label', 'asc'],
    ['slug', 'asc'],
  ]
  const rows = await Term.findAll({ where: after(cursor, 'label'), include: WITH_EXPLAINER, order, limit: limit + 1 })
  return cutPage(rows as LoadedTerm[], limit, termLine, ({ label, slug }) => [label, slug])
}

/** The whole glossary, for the page that shows it from A to Z. */
export async function everyTerm(): Promise<TermLine[]> {
  const rows = await Term.findAll({ include: WITH_EXPLAINER, order: [['label', 'asc']] })
  return (rows as LoadedTerm[]).map(termLine)
}

/** Where a term is said, in the episodes this actor may see, the newest first. */
async function heardBy(actor: Actor, termId: string): Promise<HeardView[]> {
  const rows = (await Hearing.findAll({
    where: { termId },
    include: [{ association: 'episode', required: true, where: visibleTo(actor), include: ['channel'] }],
    order: [
      ['episode', 'publishedAt', 'desc'],
      ['episode', 'number', 'desc'],
      ['atMs', 'asc'],
    ],
    limit: 100,
  })) as (Hearing & { episode: Episode & { channel: Channel } })[]
  return rows.map(({ atMs, text, episode: { id, number, title, slug, channel } }) => ({
    episode: { id, number, title, slug, channel: { slug: channel.slug, name: channel.name } },
    at: inSeconds(atMs),
    text,
    url: episodeUrl(channel.slug, slug, atMs),
  }))
}

/** @throws Problem 404 */
export async function readTerm(actor: Actor, slug: string): Promise<TermView> {
  const row = (await Term.findOne({ where: { slug }, include: WITH_EXPLAINER })) as LoadedTerm | null
  if (!row) throw notFound('This term')
  return { ...termLine(row), sourceNote: row.sourceNote, heard: await heardBy(actor, row.id) }
}

export async function listExplainers({ cursor, limit }: EntriesQuery): Promise<Page<ExplainerLine>> {
  const order: [string, string][] = [
    ['title', 'asc'],
    ['slug', 'asc'],
  ]
  const rows = await Explainer.findAll({ where: after(cursor, 'title'), include: ['claims'], order, limit: limit + 1 })
  return cutPage(rows as LoadedExplainer[], limit, explainerLine, ({ title, slug }) => [title, slug])
}

type WholeExplainer = LoadedExplainer & {
  claims: (LoadedExplainer['claims'][number] & { source: Source | null })[]
  terms: Term[]
}

/** @throws Problem 404 */
export async function readExplainer(slug: string): Promise<ExplainerView> {
  const include = [{ association: 'claims', include: ['source'] }, 'terms']
  const row = (await Explainer.findOne({ where: { slug }, include })) as WholeExplainer | null
  if (!row) throw notFound('This explainer')
  const claims = [...row.claims].sort((a, b) => a.position - b.position)
  const cited = new Map(claims.flatMap(({ source }) => (source ? [[source.key, source]] : [])))
  return {
    ...explainerLine(row),
    edition: row.edition,
    body: row.body,
    caution: row.caution,
    checkedOn: row.checkedOn,
    claims: claims.map(claimView),
    bibliography: [...cited.values()].map(sourceView),
    terms: row.terms.map(({ slug: term, label }) => ({ slug: term, label, url: termUrl(term) })),
  }
}
