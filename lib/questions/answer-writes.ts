import type { Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { inTransaction } from '@/lib/db'
import { conflict, unprocessable } from '@/lib/errors'
import { inMs } from '@/lib/episodes/views'
import { timeCode } from '@/lib/times/rules'
import { Answer } from '@/models/answer'
import { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { Question } from '@/models/question'
import { readDeskQuestion } from './desk-reads'
import { heldQuestion, leaveTrace, moveQuestion, refreshQuestion } from './moves'
import { settleBooked } from './publication'
import { QUESTION } from './reads'
import { refusal } from './rules'
import type { AnswerInput } from './schema'
import type { DeskQuestionView } from './views'

/**
 * The episode, held so that it cannot be published underneath. Taken before the question, as publishing does.
 * One message for "not there" and "not yours", which tells nobody of another channel's drafts.
 */
async function heldEpisode(question: Question, episodeId: string, transaction: Transaction): Promise<Episode> {
  const episode = await Episode.findByPk(episodeId, { transaction, lock: transaction.LOCK.SHARE })
  if (!episode || episode.channelId !== question.channelId)
    throw unprocessable('There is no such episode on this channel.', [
      { path: 'episodeId', message: 'not on this channel' },
    ])
  return episode
}

async function held(
  actor: Actor,
  action: 'question.book' | 'question.answer',
  id: string,
  episodeId: string,
  transaction: Transaction,
) {
  const seen = permit(actor, action, await Question.findByPk(id, { transaction }), QUESTION)
  const episode = await heldEpisode(seen, episodeId, transaction)
  return { episode, question: permit(actor, action, await heldQuestion(id, transaction), QUESTION) }
}

/** Puts a question on a coming episode's list. @throws Problem 409 also when that episode is published already */
export async function bookQuestion(
  actor: Actor,
  id: string,
  { episodeId }: { episodeId: string },
): Promise<DeskQuestionView> {
  await inTransaction(async (transaction) => {
    const { question, episode } = await held(actor, 'question.book', id, episodeId, transaction)
    if (episode.state === 'published')
      throw conflict('That episode is published already. Give the seconds that answer instead.')
    const detail = `Episode ${episode.number}`
    await moveQuestion(actor, question, 'book', { bookedFor: episode.id, detail }, transaction)
  })
  return readDeskQuestion(actor, id)
}

async function refuseBeyondFilm(episode: Episode, endMs: number, transaction: Transaction): Promise<void> {
  const film = episode.footageId ? await Footage.findByPk(episode.footageId, { transaction }) : null
  if (!film?.durationMs || endMs <= film.durationMs) return
  const message = `The episode ends at ${timeCode(film.durationMs / 1000)}.`
  throw unprocessable(message, [{ path: 'end', message }])
}

/** Writes range and text; there is one answer to a question, and the newest stands. */
async function writeAnswer(
  actor: Actor,
  question: Question,
  input: AnswerInput,
  transaction: Transaction,
): Promise<Answer> {
  const { episodeId, text } = input
  const written = { episodeId, text, startMs: inMs(input.start), endMs: inMs(input.end), writtenBy: actor.id }
  // The question is held, so nobody else writes an answer between these two.
  const before = await Answer.findOne({ where: { questionId: question.id }, transaction })
  return before
    ? before.update(written, { transaction })
    : Answer.create({ questionId: question.id, ...written }, { transaction })
}

/** An answer that people have been written to about stays on its episode; its seconds and words can be mended. */
async function mendAnswer(
  actor: Actor,
  question: Question,
  input: AnswerInput,
  detail: string,
  transaction: Transaction,
) {
  const before = await Answer.findOne({ where: { questionId: question.id }, transaction })
  if (before && before.episodeId !== input.episodeId) throw conflict(refusal('answered'), { state: question.state })
  await writeAnswer(actor, question, input, transaction)
  await leaveTrace(actor, question.id, { move: 'answer', from: 'answered', to: 'answered', detail }, transaction)
  await refreshQuestion(question.id, transaction)
}

/**
 * Says which seconds of an episode answer the question, with a short text. The question is answered when that episode
 * is published, or at once when it already is.
 * @throws Problem 409 when the state does not allow it, 422 for seconds beyond the film or an episode of another channel
 */
export async function answerQuestion(actor: Actor, id: string, input: AnswerInput): Promise<DeskQuestionView> {
  await inTransaction(async (transaction) => {
    const { question, episode } = await held(actor, 'question.answer', id, input.episodeId, transaction)
    await refuseBeyondFilm(episode, inMs(input.end), transaction)
    const detail = `Episode ${episode.number}, ${timeCode(input.start)} to ${timeCode(input.end)}`
    if (question.state === 'answered') return mendAnswer(actor, question, input, detail, transaction)
    await moveQuestion(actor, question, 'answer', { bookedFor: episode.id, detail }, transaction)
    const answer = await writeAnswer(actor, question, input, transaction)
    if (episode.state !== 'published') return
    await question.reload({ transaction })
    await settleBooked(actor, question, answer, episode, transaction)
  })
  return readDeskQuestion(actor, id)
}
