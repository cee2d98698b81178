import type { ChannelView } from '@/lib/channels/views'
import type { Day } from '@/lib/dates/rules'
import { crops, type Crop } from '@/lib/topics/crops'
import type { StageKey } from '@/lib/topics/stage-words'
import type { Planting } from '@/models/planting'
import type { Season } from '@/models/season'
import type { StageWindow } from '@/models/stage-window'
import type { Chapter } from '@/models/chapter'
import type { ChapterTopic } from '@/models/chapter-topic'
import type { Episode } from '@/models/episode'
import { inOrder, mainCrop } from './rules'

export type WindowView = { stage: StageKey; startsOn: Day; endsOn: Day }

/** A lane of the season board. */
export type PlantingView = {
  id: string
  crop: Crop
  field: string
  areaAcres: number | null
  plantedOn: Day | null
  /** In the order of the year. */
  windows: WindowView[]
}

export type SeasonView = { id: string; year: number; edition: number; plantings: PlantingView[] }

/** An episode as the board and the short lists beside it need it. */
export type FilmedEpisode = {
  number: number
  title: string
  url: string
  filmedOn: Day
  /** The crop most of its chapters are filed under; null when it is about the whole farm. */
  crop: Crop | null
}

/** The front page of a channel. */
export type Board = {
  channel: ChannelView
  today: Day
  years: number[]
  season: SeasonView | null
  episodes: FilmedEpisode[]
}

/** A season at the desk: read by everybody there, edited by owner and editors. */
export type DeskSeason = {
  channel: ChannelView
  today: Day
  years: number[]
  season: SeasonView | null
  mayEdit: boolean
}

export type SeasonRow = Season & { plantings?: (Planting & { windows?: StageWindow[] })[] }

const windowView = ({ stage, startsOn, endsOn }: StageWindow): WindowView => ({ stage, startsOn, endsOn })

const plantingView = (row: Planting & { windows?: StageWindow[] }): PlantingView => ({
  id: row.id,
  // What is stored was checked against the list on its way in.
  crop: row.crop as Crop,
  field: row.field,
  areaAcres: row.areaAcres,
  plantedOn: row.plantedOn,
  windows: inOrder((row.windows ?? []).map(windowView)),
})

const laneOrder = (a: PlantingView, b: PlantingView) =>
  crops.indexOf(a.crop) - crops.indexOf(b.crop) || a.field.localeCompare(b.field)

/** Lanes stand in the order of the crop list, then by field, so that two seasons can be laid side by side. */
export const seasonView = (row: SeasonRow): SeasonView => ({
  id: row.id,
  year: row.year,
  edition: row.edition,
  plantings: (row.plantings ?? []).map(plantingView).sort(laneOrder),
})

export type FilmedRow = Episode & { chapters?: (Chapter & { topics?: ChapterTopic[] })[] }

/** Only for rows with a day of filming. */
export const filmedEpisode = (row: FilmedRow, channelSlug: string): FilmedEpisode => ({
  number: row.number,
  title: row.title,
  url: `/channels/${channelSlug}/episodes/${row.slug}`,
  filmedOn: row.filmedOn ?? '',
  crop: mainCrop((row.chapters ?? []).flatMap(({ topics }) => (topics ?? []).map(({ code }) => code))),
})
