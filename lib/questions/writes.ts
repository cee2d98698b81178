import type { Transaction } from 'sequelize'
import { Op } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit, requirePerson } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { now } from '@/lib/clock'
import { inTransaction } from '@/lib/db'
import { tooMany, unprocessable } from '@/lib/errors'
import { inMs } from '@/lib/episodes/views'
import { timeCode } from '@/lib/times/rules'
import { topicByCode } from '@/lib/topics/rules'
import { Asking } from '@/models/asking'
import type { Channel } from '@/models/channel'
import { Question } from '@/models/question'
import { keepPhotos } from './keep-photos'
import { leaveTrace, refreshQuestion } from './moves'
import { type AskPlace, readAskPlace } from './place-reads'
import { readQuestion } from './reads'
import type { DrawnPhoto } from './redraw-photos'
import type { AskInput } from './schema'
import type { QuestionView } from './views'

const HOUR_MS = 3_600_000
/** More than anybody asks in earnest. Counted from the questions themselves, so a restart does not forget. */
const MOST_AN_HOUR = 60

async function limitQuestions(askerId: string, transaction: Transaction): Promise<void> {
  const since = new Date(now().getTime() - HOUR_MS)
  const made = await Question.count({ where: { askerId, createdAt: { [Op.gt]: since } }, transaction })
  if (made >= MOST_AN_HOUR) throw tooMany(HOUR_MS / 1000)
}

/** The episode asked about: of this channel, and long enough for the second that was given. */
async function placeOf(actor: Actor, channel: Channel, { episodeId, at }: AskInput): Promise<AskPlace | null> {
  if (!episodeId) return null
  const place = await readAskPlace(actor, episodeId, at ?? null)
  if (place.episode.channelId !== channel.id)
    throw unprocessable('That episode belongs to another channel.', [
      { path: 'episodeId', message: 'of another channel' },
    ])
  if (at && place.durationMs && at * 1000 > place.durationMs) {
    const message = `The episode ends at ${timeCode(place.durationMs / 1000)}.`
    throw unprocessable(message, [{ path: 'at', message }])
  }
  return place
}

/** What was said, filled up from the chapter; a crop that was named keeps out a stage of another. */
function subjectOf(input: AskInput, place: AskPlace | null): { crop: string | null; stage: string | null } {
  const stage = input.stage ?? (!input.crop || input.crop === place?.crop ? (place?.stage ?? null) : null)
  const crop = input.crop ?? ((stage && topicByCode(stage)?.crop) || null)
  return { crop, stage }
}

/**
 * A new question, with its asker the first who is asking.
 * @throws Problem 404 for a channel or episode that is not visible, 422 against a rule, 429 after 60 in an hour
 */
export async function askQuestion(
  actor: Actor,
  input: AskInput,
  photos: readonly DrawnPhoto[] = [],
): Promise<QuestionView> {
  const person = requirePerson(actor)
  const id = await inTransaction(async (transaction) => {
    const channel = await channelBySlug(input.channel)
    permit(actor, 'question.ask', channel)
    await limitQuestions(person.id, transaction)
    const place = await placeOf(actor, channel, input)
    const question = await Question.create(
      {
        channelId: channel.id,
        askerId: person.id,
        title: input.title,
        body: input.body,
        episodeId: input.episodeId ?? null,
        atMs: input.at === null || input.at === undefined ? null : inMs(input.at),
        ...subjectOf(input, place),
      },
      { transaction },
    )
    await Asking.create({ questionId: question.id, userId: person.id }, { transaction })
    await keepPhotos(question.id, photos, transaction)
    await leaveTrace(actor, question.id, { move: 'ask', from: null, to: 'new' }, transaction)
    await refreshQuestion(question.id, transaction)
    return question.id
  })
  return readQuestion(actor, id)
}
