import Link from 'next/link'
import { dayAndMonth } from '@/lib/dates/rules'
import type { Placed } from './board-geometry'

/** Height of one level of markers above a lane, px. */
export const LEVEL = 32
/** From the foot of a track to the lowest markers: the lane with the room under and over it. */
export const ABOVE_LANE = 60

const STEM = 8

/**
 * An episode on the day it was filmed: its number in a box, on a stem that stands on the lane. The item itself has no
 * width, so that stems lie under every box, also under those of its neighbours.
 */
export function EpisodeMarker({ placed: { episode, at, level } }: { placed: Placed }) {
  const words = `Episode ${episode.number}, ${episode.title}, filmed ${dayAndMonth(episode.filmedOn)}`
  return (
    <li className="absolute flex w-0 justify-center" style={{ left: `${at}%`, bottom: ABOVE_LANE + level * LEVEL }}>
      <span
        aria-hidden="true"
        className="absolute top-full left-0 -ml-px border-l-2 border-ink"
        style={{ height: STEM + level * LEVEL }}
      />
      <Link
        href={episode.url}
        aria-label={words}
        title={words}
        className="relative z-10 flex h-7 min-w-7 shrink-0 items-center justify-center border-2 border-ink bg-sheet px-1 text-xs font-semibold text-ink no-underline hover:bg-ink hover:text-sheet hover:no-underline"
      >
        {episode.number}
      </Link>
    </li>
  )
}
