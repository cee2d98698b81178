import { QueryTypes } from 'sequelize'
import { db } from '@/lib/db'
import { tooMany } from '@/lib/errors'

type Limit = { most: number; seconds: number }

/** Counts one try; kept in the database so that a restart does not forget. Joins no transaction: a rolled-back try counts. */
export async function countTry(key: string, { seconds }: Limit): Promise<number> {
  const [row] = await db().query<{ count: number }>(
    `insert into throttles (key, count, opened_at) values ($1, 1, now())
     on conflict (key) do update set
       count = case when throttles.opened_at < now() - make_interval(secs => $2) then 1 else throttles.count + 1 end,
       opened_at = case when throttles.opened_at < now() - make_interval(secs => $2) then now() else throttles.opened_at end
     returning count`,
    { bind: [key, seconds], type: QueryTypes.SELECT, transaction: null },
  )
  return row?.count ?? 0
}

/** @throws Problem 429 once there were more than `most` tries in `seconds` */
export async function limitTries(key: string, limit: Limit): Promise<void> {
  if ((await countTry(key, limit)) > limit.most) throw tooMany(limit.seconds)
}

export async function triesSoFar(key: string, { seconds }: Limit): Promise<number> {
  const [row] = await db().query<{ count: number }>(
    'select count from throttles where key = $1 and opened_at >= now() - make_interval(secs => $2)',
    { bind: [key, seconds], type: QueryTypes.SELECT },
  )
  return row?.count ?? 0
}

export const forgetTries = (key: string) => db().query('delete from throttles where key = $1', { bind: [key] })
