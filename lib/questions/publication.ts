import type { Transaction } from 'sequelize'
import { type Actor, nobody } from '@/lib/auth/actor'
import { env } from '@/lib/env'
import { episodeUrl } from '@/lib/episodes/views'
import { post } from '@/lib/mail/outbox'
import { Answer } from '@/models/answer'
import { Channel } from '@/models/channel'
import type { Episode } from '@/models/episode'
import { Question } from '@/models/question'
import { QuestionEvent } from '@/models/question-event'
import { Verdict } from '@/models/verdict'
import { type Asker, askersOf } from './asker-reads'
import { answeredLetter } from './letters'
import { moveQuestion } from './moves'
import { questionUrl } from './views'

type Published = Pick<Episode, 'id' | 'channelId' | 'number' | 'title' | 'slug'>

/**
 * Writes to these people where their question is answered. The key counts how often it has been answered: published
 * twice it is one letter, answered anew after a "not yet" it is another.
 */
export async function postAnswerLetters(
  question: Question,
  answer: Answer,
  episode: Published,
  askers: readonly Asker[],
  transaction: Transaction,
): Promise<void> {
  const channel = await Channel.findByPk(episode.channelId, { transaction, rejectOnEmpty: true })
  const time = await QuestionEvent.count({ where: { questionId: question.id, move: 'publish' }, transaction })
  for (const asker of askers) {
    const words = answeredLetter({
      name: asker.name,
      asked: asker.title,
      askedIt: asker.asked_it,
      title: question.title,
      channel: channel.name,
      episode,
      start: answer.startMs / 1000,
      text: answer.text,
      watchUrl: env().BASE_URL + episodeUrl(channel.slug, episode.slug, answer.startMs),
      questionUrl: env().BASE_URL + questionUrl(question.id),
    })
    const key = `answered:${question.id}:${asker.id}:${time}`
    await post({ key, to: { address: asker.email, name: asker.name }, ...words }, { transaction })
  }
}

/** The answer can be watched from now on: the question is answered, and everybody asking gets a letter. */
export async function settleBooked(
  actor: Actor,
  question: Question,
  answer: Answer,
  episode: Published,
  transaction: Transaction,
): Promise<void> {
  await moveQuestion(actor, question, 'publish', { detail: `Episode ${episode.number}` }, transaction)
  // Verdicts were about the answer before this one; the history keeps them.
  await Verdict.destroy({ where: { questionId: question.id }, transaction })
  await postAnswerLetters(question, answer, episode, await askersOf(question.id, transaction), transaction)
}

/**
 * What the publication of an episode means for the questions booked on it, in the transaction that publishes it:
 * those with an answer become answered and everybody asking gets one letter, the rest go back to the queue.
 * Publishing again after a withdrawal finds nothing booked, and so writes to nobody twice. The caller holds the
 * episode's row, and booking and answering hold it too, so no question can slip in behind this.
 */
export async function answerOnPublication(
  episode: Published,
  transaction: Transaction,
): Promise<{ answered: number; returned: number }> {
  const booked = await Question.findAll({
    where: { bookedEpisodeId: episode.id, state: 'booked' },
    order: [['id', 'ASC']],
    lock: transaction.LOCK.UPDATE,
    transaction,
  })
  const questionId = booked.map(({ id }) => id)
  const answers = await Answer.findAll({ where: { episodeId: episode.id, questionId }, transaction })
  const answerTo = new Map(answers.map((answer) => [answer.questionId, answer]))
  for (const question of booked) {
    const answer = answerTo.get(question.id)
    if (answer) await settleBooked(nobody, question, answer, episode, transaction)
    else {
      const detail = `Episode ${episode.number} was published without an answer`
      await moveQuestion(nobody, question, 'return', { detail }, transaction)
    }
  }
  return { answered: answers.length, returned: booked.length - answers.length }
}
