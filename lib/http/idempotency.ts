import { createHash } from 'node:crypto'
import { QueryTypes } from 'sequelize'
import { isPerson } from '@/lib/auth/actor'
import { db, inTransaction } from '@/lib/db'
import { malformed, unprocessable } from '@/lib/errors'
import { Answer } from './answers'
import type { Asked } from './endpoint'

type Kept = { request_hash: string; status: number; headers: Record<string, string>; body: unknown }

/** Claims the key for this transaction. A second request with the same key waits here until the first is through. */
async function claim(user: string, key: string, hash: string): Promise<Kept | null> {
  const won = await db().query(
    'insert into idempotency_keys (user_id, key, request_hash) values ($1, $2, $3) on conflict do nothing returning key',
    { bind: [user, key, hash], type: QueryTypes.SELECT },
  )
  if (won.length > 0) return null
  const [kept] = await db().query<Kept>(
    'select request_hash, status, headers, body from idempotency_keys where user_id = $1 and key = $2',
    { bind: [user, key], type: QueryTypes.SELECT },
  )
  return kept ?? null
}

const hashOf = ({ request, input }: Asked<unknown, unknown, unknown>) =>
  createHash('sha256')
    .update(`${request.method} ${new URL(request.url).pathname}\n${JSON.stringify(input ?? null)}`)
    .digest('hex')

const keep = (user: string, key: string, { status, headers, body }: Answer) =>
  db().query('update idempotency_keys set status = $3, headers = $4, body = $5 where user_id = $1 and key = $2', {
    bind: [user, key, status, JSON.stringify(headers), JSON.stringify(body)],
  })

/**
 * Answers a creating POST once per person and Idempotency-Key; a retry gets the first answer again.
 * What is made and the memory of it commit together, so a process killed in between leaves neither.
 * @throws Problem 422 when the key comes back with another request
 */
export async function answeredOnce<P, Q, I>(asked: Asked<P, Q, I>, answer: (asked: Asked<P, Q, I>) => unknown) {
  const key = asked.request.headers.get('idempotency-key')
  if (key === null || !isPerson(asked.actor)) return answer(asked)
  if (!/^[\x21-\x7e]{1,128}$/.test(key)) throw malformed('Idempotency-Key: 1 to 128 plain characters.')
  const user = asked.actor.id
  const hash = hashOf(asked)
  return inTransaction(async () => {
    const kept = await claim(user, key, hash)
    if (kept && kept.request_hash !== hash)
      throw unprocessable('This Idempotency-Key came with another request before.')
    if (kept) return new Answer(kept.status, kept.body, kept.headers)
    const given = await answer(asked)
    const done = given instanceof Answer ? given : new Answer(200, given)
    await keep(user, key, done)
    return done
  })
}
