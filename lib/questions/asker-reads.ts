import { QueryTypes, type Transaction } from 'sequelize'
import { db } from '@/lib/db'

/** Somebody who wants an answer, with the question as they asked it: their own, where it was joined to another. */
export type Asker = { id: string; email: string; name: string; title: string; asked_it: boolean }

/** Everybody asking a question or one joined to it, each once. Disabled accounts get no letters. */
export const askersOf = (questionId: string, transaction: Transaction): Promise<Asker[]> =>
  db().query<Asker>(
    `select distinct on (u.id) u.id, u.email, u.name, q.title, q.asker_id = u.id as asked_it
     from askings s join questions q on q.id = s.question_id join users u on u.id = s.user_id
     where (q.id = $1 or q.joined_into = $1) and u.disabled_at is null
     order by u.id, q.asker_id = u.id desc, q.id = $1 desc`,
    { bind: [questionId], type: QueryTypes.SELECT, transaction },
  )

/** Who may say whether the answer settled it. */
export async function askerIdsOf(questionId: string): Promise<string[]> {
  const rows = await db().query<{ id: string }>(
    `select distinct s.user_id as id from askings s join questions q on q.id = s.question_id
     where q.id = $1 or q.joined_into = $1`,
    { bind: [questionId], type: QueryTypes.SELECT },
  )
  return rows.map(({ id }) => id)
}

/** Advisers of a channel who can be written to. */
export const advisersOf = (channelId: string, transaction: Transaction) =>
  db().query<{ id: string; email: string; name: string }>(
    `select u.id, u.email, u.name from memberships m join users u on u.id = m.user_id
     where m.channel_id = $1 and m.role = 'adviser' and u.disabled_at is null order by u.id`,
    { bind: [channelId], type: QueryTypes.SELECT, transaction },
  )
