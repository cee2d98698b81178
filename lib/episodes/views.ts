import type { FootageView } from '@/lib/footage/views'
import type { StageKey, Topic } from '@/lib/topics/rules'
import type { EpisodeState } from './rules'

export type ChapterView = { start: number; end: number; title: string; topics: Topic[]; stage: StageKey | null }
export type CaptionsView = { language: string; label: string; kind: string; checked: boolean; url: string }
export type ReadingView = { at: number; quantity: string; value: number; unit: string; note: string | null }
export type CorrectionView = { id: string; at: number; said: string; right: string; on: string }
/** Where something is answered: an episode and the seconds of it. */
export type FollowUpView = { number: number; title: string; channel: string; url: string; start: number; end: number }
export type AskedHereView = {
  id: string
  title: string
  state: string
  asking: number
  at: number | null
  url: string
  followUp: FollowUpView | null
}
export type AnswerHereView = {
  question: { id: string; title: string; url: string; askedOn: { number: number; title: string; url: string } | null }
  start: number
  end: number
  text: string
}
export type FilmView = {
  hls: string
  plain: string
  poster: string | null
  sizes: { height: number; bitrate: number; bytes: number }[]
}

/** A line of a list of episodes. */
export type EpisodeLine = {
  id: string
  channel: { slug: string; name: string; timeZone: string }
  number: number
  slug: string
  title: string
  summary: string | null
  season: string | null
  filmedOn: string | null
  state: EpisodeState
  publishAt: string | null
  publishedAt: string | null
  duration: number | null
  stages: StageKey[]
  topics: Topic[]
  poster: string | null
  url: string
}

/** The whole episode, as GET /api/episodes/{id} answers and the watch page shows. Positions in seconds. */
export type EpisodeView = Omit<EpisodeLine, 'stages' | 'topics' | 'poster'> & {
  language: string
  edition: number
  cautionsConfirmed: boolean
  footage: FootageView | null
  film: FilmView | null
  chapters: ChapterView[]
  captions: CaptionsView[]
  readings: ReadingView[]
  corrections: CorrectionView[]
  questions: AskedHereView[]
  answers: AnswerHereView[]
}

/** How many questions wait at a desk, by where they stand. */
export type WaitingCounts = { newQuestions: number; queued: number; booked: number }

export const episodeUrl = (channel: string, slug: string, atMs?: number | null) =>
  `/channels/${channel}/episodes/${slug}${atMs ? `?t=${atMs / 1000}` : ''}`

export const inSeconds = (ms: number): number => ms / 1000
export const inMs = (seconds: number): number => Math.round(seconds * 1000)
