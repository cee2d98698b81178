import type { Crop } from '@/lib/topics/crops'
import type { QuestionState } from './rules'

type EpisodeJson = { id: string; number: number; title: string; slug: string; state: string }

/** A question with all that its views need, as the one query of row-reads gives it. Times in ms of the episode. */
export type QuestionRow = {
  id: string
  channel_id: string
  channel_slug: string
  channel_name: string
  time_zone: string
  asker_id: string | null
  asked_by: string | null
  title: string
  body: string
  crop: Crop | null
  stage: string | null
  state: QuestionState
  set_aside_reason: string | null
  at_ms: number | null
  answered_at: Date | null
  created_at: Date
  edition: number
  asking: number
  you_are_asking: boolean
  joined: number
  settled_yes: number
  settled_no: number
  episode: EpisodeJson | null
  booked: EpisodeJson | null
  answer: { start_ms: number; end_ms: number; text: string; episode: EpisodeJson } | null
  into: { id: string; title: string } | null
  photos: { name: string; width: number; height: number; alt: string }[]
}
