import { areaWords, boardSpan } from '@/lib/seasons/rules'
import type { FilmedEpisode, PlantingView, SeasonView } from '@/lib/seasons/views'
import type { Day } from '@/lib/dates/rules'
import { cropWord } from '@/lib/topics/crops'
import { dayAt, lanesOf } from './board-geometry'
import { BoardKey } from './board-key'
import { BoardLane } from './board-lane'
import { BoardFoot, BoardGrid, BoardMonths } from './board-months'
import { BoardScroller } from './board-scroller'

export type SeasonBoardProps = {
  season: SeasonView
  episodes: FilmedEpisode[]
  today: Day
  units: 'us' | 'metric'
  /** The channel's page of episodes. */
  episodesUrl: string
}

/** `Long Field, 64 ac`. */
export const fieldWords = ({ field, areaAcres }: PlantingView, units: 'us' | 'metric') =>
  areaAcres === null ? field : `${field}, ${areaWords(areaAcres, units)}`

/** A farm's year: a lane per crop and field, stages over the weeks, episodes on the day they were filmed. */
export function SeasonBoard({ season, episodes, today, units, episodesUrl }: SeasonBoardProps) {
  const span = boardSpan(season.year, season.plantings)
  const { lanes, rest } = lanesOf(season, episodes)
  const filmed = episodes.map(({ filmedOn }) => filmedOn).sort()
  // A phone shows a part of the year: the part where something was filmed last, else the present.
  const shown = filmed.findLast((day) => day <= today) ?? filmed[0] ?? today
  const openAt = shown >= span.from && shown <= span.to ? dayAt(span, shown) : null
  const grid = <BoardGrid span={span} today={today} />
  return (
    <div className="sheet">
      <BoardScroller openAt={openAt}>
        <BoardMonths span={span} />
        {lanes.map(({ planting, episodes: own }) => (
          <BoardLane
            key={planting.id}
            name={cropWord(planting.crop)}
            note={fieldWords(planting, units)}
            span={span}
            episodes={own}
            stages={{ ...planting, episodesHref: `${episodesUrl}?season=${season.year}` }}
          >
            {grid}
          </BoardLane>
        ))}
        {rest.length > 0 && (
          <BoardLane name="Whole farm" note="No one crop of this year" span={span} episodes={rest}>
            {grid}
          </BoardLane>
        )}
        <BoardFoot span={span} today={today} />
      </BoardScroller>
      <BoardKey />
    </div>
  )
}
