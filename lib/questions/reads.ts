import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { encodeCursor, type Page } from '@/lib/http/paging'
import { Question } from '@/models/question'
import { orderedPlaces, type Wanted } from './order-reads'
import type { QuestionRow } from './row'
import { questionRows } from './row-reads'
import type { QuestionsQuery } from './schema'
import { type QuestionView, questionView } from './views'
import type { Useful } from './urgency-rules'
import { usefulOn } from './window-reads'

export const QUESTION = 'This question'

/** The row of a question that this actor may see. @throws Problem 404 */
export const findQuestion = async (actor: Actor, id: string) =>
  permit(actor, 'question.see', await Question.findByPk(id), QUESTION)

/** How a row is shown to whoever looks. */
export type View<T> = (row: QuestionRow, actor: Actor, useful: Useful) => T

/** The views of these ids in their order; whoever calls has asked for what this actor may see. */
export async function viewsOf<T>(ids: readonly string[], actor: Actor, view: View<T>): Promise<T[]> {
  const rows = await questionRows(ids, actor)
  const usefulOf = await usefulOn(rows.map((row) => row.channel_id))
  return rows.map((row) => view(row, actor, usefulOf(row)))
}

export async function viewOf<T>(actor: Actor, id: string, view: View<T>): Promise<T> {
  await findQuestion(actor, id)
  const [found] = await viewsOf([id], actor, view)
  return found ?? Promise.reject(new Error('the question went away between two reads'))
}

/** @throws Problem 404 when it is not there or not visible to this actor */
export const readQuestion = (actor: Actor, id: string): Promise<QuestionView> => viewOf(actor, id, questionView)

export async function pageOf<T>(
  actor: Actor,
  query: QuestionsQuery,
  channelId: string | null,
  view: View<T>,
): Promise<Page<T>> {
  const wanted: Wanted = {
    channelId,
    states: query.state ?? null,
    episodeId: query.episode ?? null,
    crop: query.crop ?? null,
    cursor: query.cursor,
    most: query.limit + 1,
  }
  const places = await orderedPlaces(query.sort, actor, wanted)
  const shown = places.slice(0, query.limit)
  const last = shown.at(-1)
  return {
    items: await viewsOf(
      shown.map(({ id }) => id),
      actor,
      view,
    ),
    nextCursor: places.length > query.limit && last ? encodeCursor(last.key) : null,
  }
}

/** Questions that this actor may see. @throws Problem 404 for an unknown channel */
export async function readQuestions(actor: Actor, query: QuestionsQuery): Promise<Page<QuestionView>> {
  const channelId = query.channel ? (await channelBySlug(query.channel)).id : null
  return pageOf(actor, query, channelId, questionView)
}
