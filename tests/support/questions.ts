import { POST as answerRoute } from '@/app/api/questions/[id]/answer/route'
import { POST as askDetailRoute } from '@/app/api/questions/[id]/ask-detail/route'
import { DELETE as stopRoute, PUT as startRoute } from '@/app/api/questions/[id]/asking/route'
import { POST as bookRoute } from '@/app/api/questions/[id]/book/route'
import { POST as joinRoute } from '@/app/api/questions/[id]/join/route'
import { POST as queueRoute } from '@/app/api/questions/[id]/queue/route'
import { GET as readRoute } from '@/app/api/questions/[id]/route'
import { POST as setAsideRoute } from '@/app/api/questions/[id]/set-aside/route'
import { POST as toAdviserRoute } from '@/app/api/questions/[id]/to-adviser/route'
import { POST as verdictRoute } from '@/app/api/questions/[id]/verdict/route'
import { makeChannel, makeEpisode, makeMember, makeUser } from '../factories'
import { call } from './requests'

const routes = {
  queue: queueRoute,
  join: joinRoute,
  'set-aside': setAsideRoute,
  'ask-detail': askDetailRoute,
  'to-adviser': toAdviserRoute,
  book: bookRoute,
  answer: answerRoute,
  verdict: verdictRoute,
}
export type Move = keyof typeof routes

/** Calls a question's endpoint as somebody, or as nobody. */
export const move = (name: Move, id: string, as?: string, body: object = {}) =>
  call(routes[name], `/api/questions/${id}/${name}`, { method: 'POST', body, as, params: { id } })

export const look = (id: string, as?: string) => call(readRoute, `/api/questions/${id}`, { as, params: { id } })

export const startAsking = (id: string, as?: string) =>
  call(startRoute, `/api/questions/${id}/asking`, { method: 'PUT', as, params: { id } })
export const stopAsking = (id: string, as?: string) =>
  call(stopRoute, `/api/questions/${id}/asking`, { method: 'DELETE', as, params: { id } })

/** A channel with everybody who has to do with its questions, and somebody of another one. */
export async function makeFarm() {
  const [channel, other] = [await makeChannel(), await makeChannel()]
  return {
    channel,
    owner: await makeMember(channel, 'owner'),
    editor: await makeMember(channel, 'editor'),
    adviser: await makeMember(channel, 'adviser'),
    stranger: await makeMember(other, 'owner'),
    asker: await makeUser(),
    viewer: await makeUser(),
    coming: await makeEpisode(channel),
    other,
  }
}
export type Farm = Awaited<ReturnType<typeof makeFarm>>
