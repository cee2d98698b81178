import { QueryTypes } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { db } from '@/lib/db'
import type { QuestionRow } from './row'

/** SQL: the questions that go together with `q`: itself and those joined to it. */
const TOGETHER = `(s.question_id = q.id or s.question_id in (select j.id from questions j where j.joined_into = q.id))`

/** SQL: how many different people want question `q` answered, those who ask one joined to it included. */
export const ASKING = `(select count(distinct s.user_id)::int from askings s where ${TOGETHER})`

const episodeJson = (table: string) => `json_build_object('id', ${table}.id, 'number', ${table}.number,
  'title', ${table}.title, 'slug', ${table}.slug, 'state', ${table}.state)`

const ROWS = `select q.id, q.channel_id, c.slug as channel_slug, c.name as channel_name, c.time_zone,
  q.asker_id, u.name as asked_by, q.title, q.body, q.crop, q.stage, q.state, q.set_aside_reason, q.at_ms,
  q.answered_at, q.created_at, q.edition, ${ASKING} as asking,
  exists (select from askings s where s.user_id = $2::uuid and ${TOGETHER}) as you_are_asking,
  (select count(*)::int from questions j where j.joined_into = q.id) as joined,
  (select count(*)::int from verdicts v where v.question_id = q.id and v.settled) as settled_yes,
  (select count(*)::int from verdicts v where v.question_id = q.id and not v.settled) as settled_no,
  case when e.id is not null then ${episodeJson('e')} end as episode,
  case when b.id is not null then ${episodeJson('b')} end as booked,
  case when a.id is not null then json_build_object('start_ms', a.start_ms, 'end_ms', a.end_ms, 'text', a.text,
    'episode', ${episodeJson('ae')}) end as answer,
  case when t.id is not null then json_build_object('id', t.id, 'title', t.title) end as into,
  coalesce((select json_agg(json_build_object('name', p.name, 'width', p.width, 'height', p.height, 'alt', p.alt)
    order by p.created_at, p.id) from question_photos p where p.question_id = q.id), '[]') as photos
  from questions q
  join channels c on c.id = q.channel_id
  left join users u on u.id = q.asker_id
  left join episodes e on e.id = q.episode_id
  left join episodes b on b.id = q.booked_episode_id
  left join answers a on a.question_id = q.id
  left join episodes ae on ae.id = a.episode_id
  left join questions t on t.id = q.joined_into`

/** The rows of these ids in their order; an id that is gone is left out. One query however many there are. */
export async function questionRows(ids: readonly string[], actor: Actor): Promise<QuestionRow[]> {
  const rows = await db().query<QuestionRow>(`${ROWS} where q.id = any($1::uuid[])`, {
    bind: [[...ids], actor.id],
    type: QueryTypes.SELECT,
  })
  const byId = new Map(rows.map((row) => [row.id, row]))
  return ids.flatMap((id) => byId.get(id) ?? [])
}
