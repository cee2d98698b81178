import type { Transaction } from 'sequelize'
import { refreshQuestion } from '@/lib/questions/moves'
import type { QuestionMove, QuestionState } from '@/lib/questions/rules'
import { timeCode } from '@/lib/times/rules'
import { Answer } from '@/models/answer'
import { Asking } from '@/models/asking'
import { Question } from '@/models/question'
import { QuestionEvent } from '@/models/question-event'
import { momentOf } from './cut-sheet'
import type { Cast } from './seed-episodes'
import { idOf, type Ids } from './seed-people'
import { ownerOf } from './story/channels'
import { questions } from './story/questions'
import { episodes } from './story/story'
import type { StoryQuestion } from './story/types'

const day = 86_400_000
const afternoonOf = (date: string) => new Date(`${date}T15:20:00Z`)

/** All questions with their askers, their history, and where they came back answered. */
export async function seedQuestions(cast: Cast, episodeIds: Ids, transaction: Transaction): Promise<void> {
  const ids: Ids = new Map()
  // A joined question names the one it is joined to, which must be there first.
  for (const question of [...questions].sort((a, b) => Number(Boolean(a.into)) - Number(Boolean(b.into)))) {
    const row = await seedQuestion(question, cast, episodeIds, ids, transaction)
    ids.set(question.key, row.id)
    await seedAskings(row, question, cast, transaction)
    if (question.answer) await seedAnswer(row.id, question, cast, episodeIds, transaction)
    await seedHistory(row, question, cast, transaction)
    await refreshQuestion(row.id, transaction)
  }
}

function seedQuestion(
  question: StoryQuestion,
  { channels, people, sheets }: Cast,
  episodeIds: Ids,
  questionIds: Ids,
  transaction: Transaction,
) {
  const { title, body, crop, stage, state, at, into, reason } = question
  const sheet = at && sheets.get(at.episode)
  const bookedFor = question.bookedFor ?? question.answer?.episode
  return Question.create(
    {
      ...{ title, body, crop, stage, state },
      channelId: idOf(channels, question.channel),
      askerId: idOf(people, question.asker),
      episodeId: at ? idOf(episodeIds, at.episode) : null,
      atMs: at && sheet ? momentOf(sheet, at.line).startMs : null,
      setAsideReason: reason ?? null,
      joinedInto: into ? idOf(questionIds, into) : null,
      bookedEpisodeId: bookedFor ? idOf(episodeIds, bookedFor) : null,
      answeredAt: answeredAt(question),
      createdAt: afternoonOf(question.askedOn),
    },
    { transaction },
  )
}

const episodeOf = (key: string | undefined) => episodes.find((one) => one.key === key)

function answeredAt({ answer }: StoryQuestion): Date | null {
  const publishedOn = episodeOf(answer?.episode)?.publishedOn
  return publishedOn ? new Date(`${publishedOn}T12:00:00Z`) : null
}

async function seedAskings(row: Question, { asker, alsoAsking }: StoryQuestion, cast: Cast, transaction: Transaction) {
  const askings = [asker, ...alsoAsking].map((key, index) => ({
    questionId: row.id,
    userId: idOf(cast.people, key),
    createdAt: new Date(row.createdAt.getTime() + (index * day) / 2),
  }))
  await Asking.bulkCreate(askings, { transaction })
}

/** From the first word of one sentence to the last of another. */
function rangeOf({ answer }: StoryQuestion, { sheets }: Cast) {
  const sheet = answer && sheets.get(answer.episode)
  if (!sheet) throw new Error('an answer needs a film')
  return { startMs: momentOf(sheet, answer.from).startMs, endMs: momentOf(sheet, answer.to).endMs }
}

async function seedAnswer(
  questionId: string,
  question: StoryQuestion,
  cast: Cast,
  episodeIds: Ids,
  transaction: Transaction,
) {
  const { episode = '', text = '' } = question.answer ?? {}
  const writtenBy = idOf(cast.people, ownerOf(question.channel))
  const answer = { questionId, episodeId: idOf(episodeIds, episode), text, writtenBy, ...rangeOf(question, cast) }
  await Answer.create(answer, { transaction })
}

type Step = { move: QuestionMove | 'ask'; to: QuestionState; at: Date; detail?: string }

/** What was done with the question to bring it where it stands. */
function stepsOf(question: StoryQuestion, cast: Cast): Step[] {
  const asked = afternoonOf(question.askedOn)
  const later = (days: number) => new Date(asked.getTime() + days * day)
  const ask: Step = { move: 'ask', to: 'new', at: asked }
  const queue: Step = { move: 'queue', to: 'queued', at: later(1) }
  const number = episodeOf(question.bookedFor ?? question.answer?.episode)?.number
  if (question.state === 'new') return [ask]
  if (question.state === 'queued') return [ask, queue]
  if (question.state === 'booked')
    return [ask, queue, { move: 'book', to: 'booked', at: later(3), detail: `Episode ${number}` }]
  if (question.state === 'joined') {
    const target = questions.find((one) => one.key === question.into)?.title
    return [ask, { move: 'join', to: 'joined', at: later(1), detail: target }]
  }
  if (question.state === 'set-aside')
    return [ask, { move: 'set-aside', to: 'set-aside', at: later(2), detail: question.reason }]
  const { startMs, endMs } = rangeOf(question, cast)
  const range = `Episode ${number}, ${timeCode(startMs / 1000)} to ${timeCode(endMs / 1000)}`
  const published = answeredAt(question) ?? later(20)
  const written = new Date(published.getTime() - day)
  return [
    ask,
    queue,
    { move: 'answer', to: 'booked', at: written, detail: range },
    { move: 'publish', to: 'answered', at: published, detail: `Episode ${number}` },
  ]
}

async function seedHistory(row: Question, question: StoryQuestion, cast: Cast, transaction: Transaction) {
  const owner = idOf(cast.people, ownerOf(question.channel))
  const steps = stepsOf(question, cast)
  const events = steps.map(({ move, to, at, detail = null }, index) => ({
    questionId: row.id,
    actorId: move === 'ask' ? row.askerId : owner,
    move,
    fromState: steps[index - 1]?.to ?? null,
    toState: to,
    detail,
    createdAt: at,
  }))
  await QuestionEvent.bulkCreate(events, { transaction })
}
