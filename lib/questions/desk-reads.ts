import { QueryTypes } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { may, permit } from '@/lib/auth/policy'
import { readDeskChannel } from '@/lib/channels/reads'
import { db } from '@/lib/db'
import { notFound } from '@/lib/errors'
import type { Page } from '@/lib/http/paging'
import { Question } from '@/models/question'
import { readComingEpisodes } from './booking-reads'
import { alikeQuestions } from './likeness-reads'
import { findQuestion, pageOf, QUESTION, readQuestion, viewOf } from './reads'
import type { QuestionState } from './rules'
import { questionIdOf, type QuestionsQuery } from './schema'
import {
  type DeskQuestionView,
  deskQuestionView,
  type ComingEpisode,
  type LikenessView,
  type QueueFigures,
  type QuestionEventView,
  type QuestionView,
} from './views'

/** A question with what the desk sees besides. @throws Problem 404, 401 or 403 for anybody not at its desk */
export async function readDeskQuestion(actor: Actor, id: string): Promise<DeskQuestionView> {
  permit(actor, 'question.sort', await Question.findByPk(id), QUESTION)
  return viewOf(actor, id, deskQuestionView)
}

/** The channel's questions as its desk sees them. @throws Problem 404, 401 */
export async function readQueue(
  actor: Actor,
  slug: string,
  query: Omit<QuestionsQuery, 'channel'>,
): Promise<Page<DeskQuestionView>> {
  const channel = await readDeskChannel(actor, slug)
  return pageOf(actor, query, channel.id, deskQuestionView)
}

/** How many wait at a channel's desk. @throws Problem 404, 401 */
export async function readQueueFigures(actor: Actor, slug: string): Promise<QueueFigures> {
  const channel = await readDeskChannel(actor, slug)
  const [row] = await db().query<QueueFigures>(
    `select count(*)::int as open, count(*) filter (where state = 'new')::int as fresh,
       count(*) filter (where state = 'booked')::int as booked
     from questions where channel_id = $1 and state in ('new', 'queued', 'booked')`,
    { bind: [channel.id], type: QueryTypes.SELECT },
  )
  return row ?? { open: 0, fresh: 0, booked: 0 }
}

type EventRow = {
  id: string
  move: string
  by: string | null
  to_state: string
  detail: string | null
  created_at: Date
}

/** Who did what with a question and why, oldest first; for its desk alone. */
export async function readHistory(actor: Actor, id: string): Promise<QuestionEventView[]> {
  permit(actor, 'question.history', await Question.findByPk(id), QUESTION)
  const rows = await db().query<EventRow>(
    `select v.id, v.move, u.name as by, v.to_state, v.detail, v.created_at from question_events v
     left join users u on u.id = v.actor_id where v.question_id = $1 order by v.created_at, v.id`,
    { bind: [id], type: QueryTypes.SELECT },
  )
  return rows.map(({ id: eventId, move, by, to_state, detail, created_at }) => ({
    id: eventId,
    move,
    by,
    to: to_state as QuestionState,
    detail,
    on: created_at.toISOString(),
  }))
}

/** The question as this actor sees it, with the desk's part where they sit at its desk. @throws Problem 404 */
export async function readForActor(actor: Actor, id: string): Promise<QuestionView | DeskQuestionView> {
  const question = await findQuestion(actor, id)
  return may(actor, 'question.sort', question) ? readDeskQuestion(actor, id) : readQuestion(actor, id)
}

export type Sheet = {
  question: DeskQuestionView
  history: QuestionEventView[]
  alike: LikenessView[]
  coming: ComingEpisode[]
  mayBook: boolean
}

/** Everything that stands beside the queue for one question of this channel. @throws Problem 404 also for one of another channel */
export async function readSheet(actor: Actor, slug: string, id: string): Promise<Sheet> {
  const { id: channelId } = await readDeskChannel(actor, slug)
  const row = await Question.findOne({ where: { id: questionIdOf(id), channelId } })
  if (!row) throw notFound(QUESTION)
  const [question, history, found, coming] = await Promise.all([
    readDeskQuestion(actor, row.id),
    readHistory(actor, row.id),
    alikeQuestions(actor, channelId, { q: row.title, limit: 6 }),
    readComingEpisodes(actor, slug),
  ])
  const alike = found.filter((other) => other.id !== row.id)
  return { question, history, alike, coming, mayBook: may(actor, 'question.book', { channelId }) }
}
