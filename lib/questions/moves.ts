import { literal, type Transaction } from 'sequelize'
import { type Actor, isPerson } from '@/lib/auth/actor'
import { now } from '@/lib/clock'
import { conflict } from '@/lib/errors'
import { enqueue } from '@/lib/jobs/queue'
import { refreshSearch } from '@/lib/search/jobs'
import { Question } from '@/models/question'
import { QuestionEvent } from '@/models/question-event'
import { afterMove, type QuestionMove, type QuestionState, refusal } from './rules'

/** What a move writes besides the state. */
type Change = { reason?: string; into?: string; bookedFor?: string; detail?: string | null }

/** The question, held until the transaction ends; whoever else moves it waits here and then sees the new state. */
export const heldQuestion = (id: string, transaction: Transaction) =>
  Question.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE })

/** The columns that belong to a state, and to no other: the database checks the same. */
const columnsOf = (state: QuestionState, { reason, into, bookedFor }: Change, question: Question) => ({
  state,
  setAsideReason: state === 'set-aside' ? (reason ?? null) : null,
  joinedInto: state === 'joined' ? (into ?? null) : null,
  bookedEpisodeId: state === 'booked' || state === 'answered' ? (bookedFor ?? question.bookedEpisodeId) : null,
  answeredAt: state === 'answered' ? now() : null,
})

type Trace = {
  move: QuestionMove | 'ask' | 'verdict'
  from: QuestionState | null
  to: QuestionState
  detail?: string | null
}

/** Writes down who did what; part of every change. Returns the event's id. */
export async function leaveTrace(actor: Actor, questionId: string, trace: Trace, transaction: Transaction) {
  const actorId = isPerson(actor) ? actor.id : null
  const { move, from: fromState, to: toState, detail = null } = trace
  const event = await QuestionEvent.create({ questionId, actorId, move, fromState, toState, detail }, { transaction })
  return event.id
}

/** The index looks at the question again once this transaction is through. */
export const refreshQuestion = (id: string, transaction: Transaction) =>
  enqueue(refreshSearch, { kind: 'question', id }, { transaction, key: `question:${id}` })

/**
 * The one way in which a question changes its state. The state it was seen in stands in the WHERE clause, so of two
 * moves at once one wins. Returns the id of the event.
 * @throws Problem 409 when the state does not allow the move
 */
export async function moveQuestion(
  actor: Actor,
  question: Question,
  move: QuestionMove,
  change: Change,
  transaction: Transaction,
): Promise<string> {
  const from = question.state
  const to = afterMove(from, move)
  if (!to) throw conflict(refusal(from), { state: from })
  const columns = to === from && move !== 'answer' ? {} : columnsOf(to, change, question)
  const [moved] = await Question.update(
    { ...columns, edition: literal('edition + 1') as unknown as number },
    { where: { id: question.id, state: from }, transaction },
  )
  if (moved === 0) throw conflict('Somebody else moved this question just now. Load it again.')
  const detail = change.detail ?? change.reason ?? null
  const event = await leaveTrace(actor, question.id, { move, from, to, detail }, transaction)
  await refreshQuestion(question.id, transaction)
  return event
}
