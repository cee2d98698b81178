import { type Actor, isAtDesk, isPerson } from '@/lib/auth/actor'
import { type FollowUpView, episodeUrl, inSeconds } from '@/lib/episodes/views'
import type { Crop } from '@/lib/topics/crops'
import { topicByCode } from '@/lib/topics/rules'
import type { StageKey } from '@/lib/topics/stage-words'
import type { QuestionMove, QuestionState } from './rules'
import type { QuestionRow } from './row'
import { deskMovesIn } from './rules'
import type { Useful } from './urgency-rules'

export type EpisodeRef = { id: string; number: number; title: string; url: string }
export type PhotoView = { url: string; width: number; height: number; alt: string }
/** The episode and seconds that answer, with the short written answer. */
export type AnswerView = FollowUpView & { id: string; text: string }

/** A question as anybody who may see it sees it. Positions in seconds; of people no more than the name they gave. */
export type QuestionView = {
  id: string
  url: string
  channel: { slug: string; name: string }
  title: string
  body: string
  state: QuestionState
  /** How many want it answered, those of joined questions included. */
  asking: number
  youAreAsking: boolean
  /** Null when the person has left. */
  askedBy: string | null
  askedAt: string
  /** Where it was asked; only while that episode is visible to whoever looks. */
  episode: EpisodeRef | null
  at: number | null
  crop: Crop | null
  stage: string | null
  useful: Useful
  usefulUntil: string | null
  photos: PhotoView[]
  answeredAt: string | null
  /** Only while the answering episode is visible to whoever looks. */
  followUp: AnswerView | null
  joinedInto: { id: string; title: string; url: string } | null
  setAsideReason: string | null
  edition: number
}

/** What the desk sees besides. */
export type DeskQuestionView = QuestionView & {
  moves: QuestionMove[]
  bookedFor: EpisodeRef | null
  /** The range and text written for an episode that may not be published yet. */
  answer: { episodeId: string; start: number; end: number; text: string } | null
  joined: number
  settled: { yes: number; no: number }
}

export type QuestionEventView = {
  id: string
  move: string
  by: string | null
  to: QuestionState
  detail: string | null
  on: string
}

/** An episode that questions can be booked for. */
export type ComingEpisode = { id: string; number: number; title: string }

/** How many wait at a desk: all of them, the new ones, the booked ones. */
export type QueueFigures = { open: number; fresh: number; booked: number }

export type LikenessView = {
  kind: 'question' | 'passage'
  /** 0 nothing alike, 1 the same words */
  score: number
  title: string
  url: string
  id?: string
  state?: QuestionState
  asking?: number
  snippet?: string
  start?: number
  end?: number
}

export const questionUrl = (id: string) => `/questions/${id}`
export const photoUrl = (name: string) => `/media/photos/${name}`

/** The principal stage that draws the question's pattern. */
export const stageKeyOf = (code: string | null): StageKey | null => (code && topicByCode(code)?.stage) || null

const mayWatch = (actor: Actor, channelId: string, state: string | null) =>
  state === 'published' || isAtDesk(actor, channelId)

function whereAsked(row: QuestionRow, actor: Actor): EpisodeRef | null {
  const { episode } = row
  if (!episode || !mayWatch(actor, row.channel_id, episode.state)) return null
  const url = episodeUrl(row.channel_slug, episode.slug, row.at_ms)
  return { id: episode.id, number: episode.number, title: episode.title, url }
}

function followUpOf(row: QuestionRow, actor: Actor): AnswerView | null {
  const { answer } = row
  if (row.state !== 'answered' || !answer || !mayWatch(actor, row.channel_id, answer.episode.state)) return null
  const { id, number, title, slug } = answer.episode
  return {
    id,
    number,
    title,
    channel: row.channel_slug,
    url: episodeUrl(row.channel_slug, slug, answer.start_ms),
    start: inSeconds(answer.start_ms),
    end: inSeconds(answer.end_ms),
    text: answer.text,
  }
}

export function questionView(row: QuestionRow, actor: Actor, useful: Useful): QuestionView {
  const mayKnowReason = isAtDesk(actor, row.channel_id) || (isPerson(actor) && actor.id === row.asker_id)
  return {
    id: row.id,
    url: questionUrl(row.id),
    channel: { slug: row.channel_slug, name: row.channel_name },
    title: row.title,
    body: row.body,
    state: row.state,
    asking: row.asking,
    youAreAsking: row.you_are_asking,
    askedBy: row.asked_by,
    askedAt: row.created_at.toISOString(),
    episode: whereAsked(row, actor),
    at: row.at_ms === null ? null : inSeconds(row.at_ms),
    crop: row.crop,
    stage: row.stage,
    useful,
    usefulUntil: useful.kind === 'unknown' ? null : useful.until,
    photos: row.photos.map(({ name, width, height, alt }) => ({ url: photoUrl(name), width, height, alt })),
    answeredAt: row.answered_at?.toISOString() ?? null,
    followUp: followUpOf(row, actor),
    joinedInto: row.into && { ...row.into, url: questionUrl(row.into.id) },
    setAsideReason: mayKnowReason ? row.set_aside_reason : null,
    edition: row.edition,
  }
}

/** Only for somebody at the channel's desk. */
export function deskQuestionView(row: QuestionRow, actor: Actor, useful: Useful): DeskQuestionView {
  const { answer, booked } = row
  return {
    ...questionView(row, actor, useful),
    moves: deskMovesIn(row.state),
    bookedFor: booked && {
      id: booked.id,
      number: booked.number,
      title: booked.title,
      url: episodeUrl(row.channel_slug, booked.slug),
    },
    answer: answer && {
      episodeId: answer.episode.id,
      start: inSeconds(answer.start_ms),
      end: inSeconds(answer.end_ms),
      text: answer.text,
    },
    joined: row.joined,
    settled: { yes: row.settled_yes, no: row.settled_no },
  }
}
