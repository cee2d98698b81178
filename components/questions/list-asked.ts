import { openStates, questionStates, type QuestionState } from '@/lib/questions/rules'
import { type QuestionsQuery, questionsQuery } from '@/lib/questions/schema'

export type Query = Record<string, string | string[] | undefined>

const first = (value: string | string[] | undefined) => (Array.isArray(value) ? value[0] : value) || undefined

/** What the page's filter offers as a state. */
export const statesOffered = ['waiting', 'answered', 'all'] as const
export type StateOffered = (typeof statesOffered)[number]

const publicStates = questionStates.filter((state) => state !== 'set-aside' && state !== 'joined')
const meant: Record<StateOffered, readonly QuestionState[]> = {
  waiting: openStates,
  answered: ['answered'],
  all: publicStates,
}

export type ListAsked = { query: QuestionsQuery; filter: Record<string, string>; state: StateOffered }

/** The page's address as a query; what is not understood is left out, for a page should not fail over its address. */
export function listAsked(asked: Query, channel?: string): ListAsked {
  const state = statesOffered.find((one) => one === first(asked.state)) ?? 'waiting'
  const given = {
    channel: channel ?? first(asked.channel),
    crop: first(asked.crop),
    cursor: first(asked.cursor),
    sort: state === 'waiting' ? 'urgency' : 'newest',
    limit: 25,
    state: meant[state].join(','),
  }
  const read = questionsQuery.safeParse(given)
  const query = read.success ? read.data : questionsQuery.parse({ ...given, crop: undefined, cursor: undefined })
  const farm = channel ? undefined : query.channel
  return {
    query,
    state,
    filter: { state, ...(farm ? { channel: farm } : {}), ...(query.crop ? { crop: query.crop } : {}) },
  }
}
