import type { Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { inTransaction } from '@/lib/db'
import { conflict, unprocessable } from '@/lib/errors'
import { Answer } from '@/models/answer'
import { Episode } from '@/models/episode'
import { Question } from '@/models/question'
import { askersOf } from './asker-reads'
import { heldQuestion, moveQuestion } from './moves'
import { postAnswerLetters } from './publication'
import { readDeskQuestion } from './desk-reads'
import { QUESTION } from './reads'
import type { DeskQuestionView } from './views'

type Work = (question: Question, transaction: Transaction) => Promise<unknown>

/** Something the desk does with a question: the row is held, proven to be the desk's, moved, and told as it stands. */
export async function atDesk(actor: Actor, id: string, work: Work): Promise<DeskQuestionView> {
  await inTransaction(async (transaction) => {
    const question = permit(actor, 'question.sort', await heldQuestion(id, transaction), QUESTION)
    await work(question, transaction)
  })
  return readDeskQuestion(actor, id)
}

/** Into the queue: from new, from set aside, out of a joining, or off an episode's list. @throws Problem 409 */
export const queueQuestion = (actor: Actor, id: string) =>
  atDesk(actor, id, (question, transaction) => moveQuestion(actor, question, 'queue', {}, transaction))

/** Set aside, seen from now on by the desk and the asker alone. @throws Problem 409 */
export const setAsideQuestion = (actor: Actor, id: string, { reason }: { reason: string }) =>
  atDesk(actor, id, (question, transaction) => moveQuestion(actor, question, 'set-aside', { reason }, transaction))

/** The question that another is joined to, of the same channel and not itself joined or set aside. */
async function joinTarget(actor: Actor, question: Question, into: string, transaction: Transaction): Promise<Question> {
  if (into === question.id) throw unprocessable('A question cannot be joined to itself.')
  const target = await heldQuestion(into, transaction)
  if (!target || target.channelId !== question.channelId)
    throw unprocessable('There is no such question on this channel.', [
      { path: 'into', message: 'not on this channel' },
    ])
  if (target.state === 'joined') throw conflict('That question is itself joined to another one. Join to that one.')
  if (target.state === 'set-aside') throw conflict('That question is set aside. Put it in the queue first.')
  return target
}

/** Whoever asks something that is answered already hears where, as if they had asked in time. */
async function tellLatecomers(question: Question, target: Question, transaction: Transaction): Promise<void> {
  if (target.state !== 'answered') return
  const answer = await Answer.findOne({ where: { questionId: target.id }, transaction })
  const episode = answer && (await Episode.findByPk(answer.episodeId, { transaction }))
  if (!answer || episode?.state !== 'published') return
  await postAnswerLetters(target, answer, episode, await askersOf(question.id, transaction), transaction)
}

/**
 * Joins a question to another that asks the same. Both keep their askers; what was joined to this one moves along, so
 * that joining never goes more than one step deep.
 * @throws Problem 409 for a move that the states do not allow, 422 for a question of another channel
 */
export const joinQuestion = (actor: Actor, id: string, { into }: { into: string }) =>
  atDesk(actor, id, async (question, transaction) => {
    const target = await joinTarget(actor, question, into, transaction)
    await tellLatecomers(question, target, transaction)
    await moveQuestion(actor, question, 'join', { into, detail: target.title }, transaction)
    await Question.update({ joinedInto: into }, { where: { joinedInto: id }, transaction })
  })
