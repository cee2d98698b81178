import { openStates, type QuestionState, questionStates } from '@/lib/questions/rules'
import { type QuestionsQuery, questionsQuery } from '@/lib/questions/schema'

export type Query = Record<string, string | string[] | undefined>

const first = (value: string | string[] | undefined) => (Array.isArray(value) ? value[0] : value) || undefined

/** `open` is everything that waits. */
export type QueueState = 'open' | QuestionState

export type QueueAsked = {
  query: QuestionsQuery
  state: QueueState
  chosen: string | null
  filter: Record<string, string>
}

/** The address of the queue as a query; what is not understood is left out. */
export function queueAsked(asked: Query): QueueAsked {
  const state: QueueState = questionStates.find((one) => one === first(asked.state)) ?? 'open'
  const given = {
    state: state === 'open' ? openStates.join(',') : state,
    sort: first(asked.sort) ?? 'urgency',
    crop: first(asked.crop),
    cursor: first(asked.cursor),
    limit: 25,
  }
  const read = questionsQuery.safeParse(given)
  const query = read.success ? read.data : questionsQuery.parse({ state: given.state, sort: 'urgency', limit: 25 })
  return {
    query,
    state,
    chosen: first(asked.question) ?? null,
    filter: { state, sort: query.sort, ...(query.crop ? { crop: query.crop } : {}) },
  }
}
