import { QueryTypes } from 'sequelize'
import { type Actor, deskChannelIds } from '@/lib/auth/actor'
import { now } from '@/lib/clock'
import { db } from '@/lib/db'
import { decodeCursor } from '@/lib/http/paging'
import type { Crop } from '@/lib/topics/crops'
import { isOpen, type QuestionState } from './rules'
import { ASKING } from './row-reads'
import type { QuestionSort } from './schema'
import { urgencyOf } from './urgency-rules'
import { usefulOn } from './window-reads'

/** A question's place in a list: its id, and the values a cursor needs to go on after it. */
export type Place = { id: string; key: (string | number)[] }

export type Wanted = {
  channelId: string | null
  states: readonly QuestionState[] | null
  episodeId: string | null
  crop: Crop | null
  cursor: string | undefined
  /** one more than the page shows tells whether there is a next page */
  most: number
}

/** What is set aside is for the desk and the asker alone. */
const VISIBLE = `(q.state <> 'set-aside' or q.channel_id = any($1::uuid[]) or q.asker_id = $2::uuid)
  and ($3::uuid is null or q.channel_id = $3) and ($4::text[] is null or q.state = any($4))
  and ($5::uuid is null or q.episode_id = $5) and ($6::text is null or q.crop = $6)`

const bindings = (actor: Actor, { channelId, states, episodeId, crop }: Wanted): unknown[] => [
  deskChannelIds(actor),
  actor.id,
  channelId,
  states && [...states],
  episodeId,
  crop,
]

const rowsOf = <T extends object>(sql: string, bind: unknown[]) => db().query<T>(sql, { bind, type: QueryTypes.SELECT })

/** Microseconds and all: two questions of one millisecond keep their order from page to page. */
const CREATED = `to_char(q.created_at at time zone 'utc', 'YYYY-MM-DD"T"HH24:MI:SS.US"Z"')`

async function newestFirst(actor: Actor, wanted: Wanted): Promise<Place[]> {
  const [at, id] = wanted.cursor ? decodeCursor(wanted.cursor, 2) : [null, null]
  const rows = await rowsOf<{ id: string; at: string }>(
    `select q.id, ${CREATED} as at from questions q where ${VISIBLE}
     and ($7::timestamptz is null or (q.created_at <= $7 and (q.created_at < $7 or q.id > $8::uuid)))
     order by q.created_at desc, q.id limit $9`,
    [...bindings(actor, wanted), at, id, wanted.most],
  )
  return rows.map((row) => ({ id: row.id, key: [row.at, row.id] }))
}

async function mostAskingFirst(actor: Actor, wanted: Wanted): Promise<Place[]> {
  const [asking, id] = wanted.cursor ? decodeCursor(wanted.cursor, 2) : [null, null]
  const rows = await rowsOf<{ id: string; asking: number }>(
    `select * from (select q.id, ${ASKING} as asking from questions q where ${VISIBLE}) counted
     where ($7::int is null or asking < $7 or (asking = $7 and id > $8::uuid)) order by asking desc, id limit $9`,
    [...bindings(actor, wanted), asking, id, wanted.most],
  )
  return rows.map((row) => ({ id: row.id, key: [row.asking, row.id] }))
}

type Light = {
  id: string
  channel_id: string
  time_zone: string
  crop: Crop | null
  stage: string | null
  state: QuestionState
  created_at: Date
  asking: number
}

const DAY_MS = 86_400_000

/** What no longer waits for an answer comes behind everything that does. */
const CLOSED = -1

async function scoredFirst(actor: Actor, wanted: Wanted): Promise<{ id: string; urgency: number }[]> {
  const rows = await rowsOf<Light>(
    `select q.id, q.channel_id, c.time_zone, q.crop, q.stage, q.state, q.created_at, ${ASKING} as asking
     from questions q join channels c on c.id = q.channel_id where ${VISIBLE}`,
    bindings(actor, wanted),
  )
  const usefulOf = await usefulOn(rows.map((row) => row.channel_id))
  const today = Math.floor(now().getTime() / DAY_MS)
  return rows.map((row) => {
    const useful = usefulOf(row)
    const daysLeft = useful.kind === 'unknown' ? null : useful.days
    // Whole days: a page fetched a minute later goes on in the same order.
    const waitedDays = today - Math.floor(row.created_at.getTime() / DAY_MS)
    const urgency = isOpen(row.state) ? urgencyOf({ daysLeft, asking: row.asking, waitedDays }) : CLOSED
    return { id: row.id, urgency: Math.round(urgency * 1000) / 1000 }
  })
}

async function mostUrgentFirst(actor: Actor, wanted: Wanted): Promise<Place[]> {
  const [urgency, id] = wanted.cursor ? decodeCursor(wanted.cursor, 2).map((value) => value) : [null, null]
  const scored = await scoredFirst(actor, wanted)
  return scored
    .sort((a, b) => b.urgency - a.urgency || (a.id < b.id ? -1 : 1))
    .filter(
      (one) => urgency === null || one.urgency < Number(urgency) || (one.urgency === urgency && one.id > String(id)),
    )
    .slice(0, wanted.most)
    .map((one) => ({ id: one.id, key: [one.urgency, one.id] }))
}

const orders: Record<QuestionSort, (actor: Actor, wanted: Wanted) => Promise<Place[]>> = {
  newest: newestFirst,
  asking: mostAskingFirst,
  urgency: mostUrgentFirst,
}

/** The places of one page in the order asked for. Only what this actor may see. @throws Problem 400 on a strange cursor */
export const orderedPlaces = (sort: QuestionSort, actor: Actor, wanted: Wanted): Promise<Place[]> =>
  orders[sort](actor, wanted)
