import type { ReactNode } from 'react'
import type { FilmedEpisode, WindowView } from '@/lib/seasons/views'
import type { Crop } from '@/lib/topics/crops'
import { placed, shapeOf, type Span } from './board-geometry'
import { ABOVE_LANE, EpisodeMarker, LEVEL } from './episode-marker'
import { LaneWindow } from './lane-window'

type BoardLaneProps = {
  name: string
  note?: string
  span: Span
  episodes: FilmedEpisode[]
  /** The stages of the planting; a lane for the whole farm has none. */
  stages?: { crop: Crop; windows: WindowView[]; episodesHref: string }
  /** What is drawn behind: the months, today. */
  children: ReactNode
}

/** One crop on one field over the year. On a narrow screen its name stays in sight above the track. */
export function BoardLane({ name, note, span, episodes, stages, children }: BoardLaneProps) {
  const markers = placed(span, episodes)
  const levels = Math.max(stages ? 1 : 0, ...markers.map(({ level }) => level + 1))
  return (
    <section aria-label={note ? `${name}, ${note}` : name} className="border-b border-rule-2 md:flex">
      <div className="sticky left-0 z-20 w-max max-w-80 bg-sheet px-3.5 pt-3 leading-tight md:w-47.5 md:shrink-0 md:py-4 md:pl-4.5">
        <h2 className="text-[1.125rem]">{name}</h2>
        {note && <p className="mt-0.5 text-xs text-ink-3">{note}</p>}
      </div>
      <div className="relative flex-1" style={{ height: ABOVE_LANE + levels * LEVEL + 8 }}>
        {children}
        {stages && (
          <ol aria-label="Stages">
            {stages.windows.map((window) => {
              const shape = shapeOf(span, window)
              return shape && <LaneWindow key={window.startsOn} window={window} shape={shape} {...stages} />
            })}
          </ol>
        )}
        {markers.length > 0 && (
          <ul aria-label="Episodes">
            {markers.map((marker) => (
              <EpisodeMarker key={marker.episode.url} placed={marker} />
            ))}
          </ul>
        )}
      </div>
    </section>
  )
}
