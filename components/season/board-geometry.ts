import { dayNumber, type Day } from '@/lib/dates/rules'
import { stageOn } from '@/lib/seasons/rules'
import type { FilmedEpisode, PlantingView, SeasonView } from '@/lib/seasons/views'

/** The days that a board shows, both ends counted. */
export type Span = { from: Day; to: Day }

/** Where a thing lies on the board, in per cent of its width. */
export type Shape = { left: number; width: number }

const daysOf = ({ from, to }: Span) => dayNumber(to) - dayNumber(from) + 1

/** The beginning of a day, in per cent from the board's left edge; outside 0 to 100 when the day is not on it. */
export const dayAt = (span: Span, day: Day): number => ((dayNumber(day) - dayNumber(span.from)) / daysOf(span)) * 100

/** The middle of a day. */
export const middleOf = (span: Span, day: Day): number => dayAt(span, day) + 50 / daysOf(span)

/** Where a stage lies, cut at the board's edges; null when none of it is on the board. Its last day counts whole. */
export function shapeOf(span: Span, { startsOn, endsOn }: { startsOn: Day; endsOn: Day }): Shape | null {
  if (endsOn < span.from || startsOn > span.to) return null
  const left = Math.max(0, dayAt(span, startsOn))
  const right = Math.min(100, dayAt(span, endsOn) + 100 / daysOf(span))
  return { left, width: right - left }
}

export type Placed = { episode: FilmedEpisode; at: number; level: number }

/** A marker is 28 px on a track of 740 px or more. */
const MARKER_WIDTH = 3.8

/** Markers at the day of filming; those that would lie on each other go one level up. Level 0 is next to the lane. */
export function placed(span: Span, episodes: FilmedEpisode[]): Placed[] {
  const lastAt: number[] = []
  return [...episodes]
    .sort((a, b) => dayNumber(a.filmedOn) - dayNumber(b.filmedOn) || a.number - b.number)
    .map((episode) => {
      const at = middleOf(span, episode.filmedOn)
      const free = lastAt.findIndex((last) => at - last >= MARKER_WIDTH)
      const level = free < 0 ? lastAt.length : free
      lastAt[level] = at
      return { episode, at, level }
    })
}

export type Lane = { planting: PlantingView; episodes: FilmedEpisode[] }

/** The lane an episode stands on: of its crop's lanes the one that was in a stage on that day, else the first. */
function laneFor(episode: FilmedEpisode, plantings: PlantingView[]): PlantingView | null {
  const own = plantings.filter(({ crop }) => crop === episode.crop)
  return own.find(({ windows }) => stageOn(windows, episode.filmedOn)) ?? own[0] ?? null
}

/** Lanes with their episodes, and the episodes that belong to none: about the whole farm, or a crop of another year. */
export function lanesOf(season: SeasonView, episodes: FilmedEpisode[]): { lanes: Lane[]; rest: FilmedEpisode[] } {
  const home = new Map(episodes.map((episode) => [episode, laneFor(episode, season.plantings)]))
  return {
    lanes: season.plantings.map((planting) => ({
      planting,
      episodes: episodes.filter((episode) => home.get(episode) === planting),
    })),
    rest: episodes.filter((episode) => home.get(episode) === null),
  }
}
