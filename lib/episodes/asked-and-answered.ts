import { QueryTypes } from 'sequelize'
import { type Actor, deskChannelIds } from '@/lib/auth/actor'
import { db } from '@/lib/db'
import { ASKING } from '@/lib/questions/row-reads'
import { type AnswerHereView, type AskedHereView, episodeUrl, inSeconds } from './views'

type AskedRow = {
  id: string
  title: string
  state: string
  at_ms: number | null
  asking: string
  start_ms: number | null
  end_ms: number | null
  number: number
  episode_title: string
  slug: string
  channel: string
}

/** Questions asked on an episode, each with the answer that this actor may watch. Set-aside and joined ones are left out. */
export async function askedOn(episodeId: string, actor: Actor): Promise<AskedHereView[]> {
  const rows = await db().query<AskedRow>(
    `select q.id, q.title, q.state, q.at_ms, ${ASKING} as asking,
       a.start_ms, a.end_ms, e.number, e.title as episode_title, e.slug, c.slug as channel
     from questions q
     left join (answers a join episodes e on e.id = a.episode_id join channels c on c.id = e.channel_id)
       on a.question_id = q.id and q.state = 'answered' and (e.state = 'published' or e.channel_id = any($2::uuid[]))
     where q.episode_id = $1 and q.state not in ('set-aside', 'joined')
     order by q.at_ms nulls last, q.created_at`,
    { bind: [episodeId, deskChannelIds(actor)], type: QueryTypes.SELECT },
  )
  return rows.map((row) => ({
    id: row.id,
    title: row.title,
    state: row.state,
    asking: Number(row.asking),
    at: row.at_ms === null ? null : inSeconds(row.at_ms),
    url: `/questions/${row.id}`,
    followUp:
      row.start_ms === null
        ? null
        : {
            number: row.number,
            title: row.episode_title,
            channel: row.channel,
            url: episodeUrl(row.channel, row.slug, row.start_ms),
            start: inSeconds(row.start_ms),
            end: inSeconds(row.end_ms ?? row.start_ms),
          },
  }))
}

type AnswerRow = {
  id: string
  title: string
  start_ms: number
  end_ms: number
  text: string
  number: number | null
  asked_title: string
  slug: string
  channel: string
  at_ms: number | null
}

/** Questions that an episode answers, in the order of their ranges; with where each was asked, if that is public. */
export async function answeredBy(episodeId: string): Promise<AnswerHereView[]> {
  const rows = await db().query<AnswerRow>(
    `select q.id, q.title, q.at_ms, a.start_ms, a.end_ms, a.text, e.number, e.title as asked_title, e.slug, c.slug as channel
     from answers a join questions q on q.id = a.question_id
     left join episodes e on e.id = q.episode_id and e.state = 'published'
     left join channels c on c.id = e.channel_id
     where a.episode_id = $1 order by a.start_ms, q.created_at`,
    { bind: [episodeId], type: QueryTypes.SELECT },
  )
  return rows.map((row) => ({
    question: {
      id: row.id,
      title: row.title,
      url: `/questions/${row.id}`,
      askedOn:
        row.number === null
          ? null
          : { number: row.number, title: row.asked_title, url: episodeUrl(row.channel, row.slug, row.at_ms) },
    },
    start: inSeconds(row.start_ms),
    end: inSeconds(row.end_ms),
    text: row.text,
  }))
}
