import { QueryTypes } from 'sequelize'
import { type Actor, deskChannelIds } from '@/lib/auth/actor'
import { channelBySlug } from '@/lib/channels/reads'
import { db } from '@/lib/db'
import type { QuestionState } from './rules'
import { alikePassages } from './passage-reads'
import { ASKING } from './row-reads'
import type { SimilarQuery } from './schema'
import { type LikenessView, questionUrl } from './views'

/** Fewer letters than this look like everything. */
const SHORTEST = 3
/** Below this a likeness is chance. Common practice, no source. */
const LEAST = 0.2

type Row = { id: string; title: string; state: QuestionState; asking: number; score: number }

/**
 * Letters and stems, each from 0 to 1; the better of the two counts, for "bean" and "beans" share letters, and
 * "How late can I roll?" and "Too late for rolling?" share stems. Stems of the body count half.
 */
const SCORE = `greatest(
  similarity(q.title, a.text),
  word_similarity(a.text, q.title) * 0.9,
  coalesce(cardinality(array(select unnest(a.stems) intersect select unnest(tsvector_to_array(to_tsvector('english', q.title)))))::float
    / nullif(cardinality(a.stems), 0), 0) * 0.95,
  coalesce(cardinality(array(select unnest(a.stems) intersect select unnest(tsvector_to_array(to_tsvector('english', q.body)))))::float
    / nullif(cardinality(a.stems), 0), 0) * 0.5)`

const alikeSql = `with a as (select $1::text as text, tsvector_to_array(to_tsvector('english', $1)) as stems),
  wanted as (select case when cardinality(a.stems) > 0
    then to_tsquery('simple', (select string_agg(quote_literal(stem), ' | ') from unnest(a.stems) stem)) end as any_stem from a),
  near as (
    select q.*, ${SCORE} as score from questions q, a, wanted
    where (q.title % a.text or to_tsvector('english', q.title || ' ' || q.body) @@ wanted.any_stem)
      and q.state <> 'joined' and ($2::uuid is null or q.channel_id = $2)
      and (q.state <> 'set-aside' or q.channel_id = any($3::uuid[]) or q.asker_id = $4::uuid))
  select q.id, q.title, q.state, ${ASKING} as asking, round(q.score::numeric, 3)::float as score from near q
  where q.score >= ${LEAST} order by q.score desc, q.created_at desc, q.id limit $5`

/** Questions alone; for a desk that looks for what can be joined. */
export async function alikeQuestions(
  actor: Actor,
  channelId: string | null,
  { q, limit }: Pick<SimilarQuery, 'q' | 'limit'>,
): Promise<LikenessView[]> {
  const rows = await db().query<Row>(alikeSql, {
    bind: [q, channelId, deskChannelIds(actor), actor.id, limit],
    type: QueryTypes.SELECT,
  })
  return rows.map(({ id, title, state, asking, score }) => ({
    kind: 'question',
    score,
    id,
    title,
    state,
    asking,
    url: questionUrl(id),
  }))
}

/** Questions and passages that look like what somebody is writing, the most alike first. @throws Problem 404 unknown channel */
export async function readAlike(
  actor: Actor,
  query: SimilarQuery,
): Promise<{ items: LikenessView[]; nextCursor: null }> {
  const channelId = query.channel ? (await channelBySlug(query.channel)).id : null
  if (query.q.length < SHORTEST) return { items: [], nextCursor: null }
  const [questions, passages] = await Promise.all([
    alikeQuestions(actor, channelId, query),
    alikePassages(actor, query.q, query.channel),
  ])
  const items = [...questions, ...passages].sort((a, b) => b.score - a.score).slice(0, query.limit)
  return { items, nextCursor: null }
}
