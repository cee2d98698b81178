import { QueryTypes } from 'sequelize'
import { db } from '@/lib/db'

/** Topic codes of the chapter a question was asked in, and of those that its answer runs through. */
export async function topicsAround(questionId: string): Promise<string[]> {
  const rows = await db().query<{ code: string }>(
    `with spans as (
       select episode_id, at_ms as first, at_ms as last from questions where id = $1 and at_ms is not null
       union all select episode_id, start_ms, end_ms from answers where question_id = $1),
     chapter_spans as (
       select c.id, s.first, s.last, c.start_ms,
         lead(c.start_ms) over (partition by c.episode_id, s.first order by c.start_ms) as next_ms
       from spans s join chapters c on c.episode_id = s.episode_id)
     select distinct t.code from chapter_spans c join chapter_topics t on t.chapter_id = c.id
     where c.start_ms <= c.last and (c.next_ms is null or c.next_ms > c.first)`,
    { bind: [questionId], type: QueryTypes.SELECT },
  )
  return rows.map(({ code }) => code)
}
