import Link from 'next/link'
import { StagePatch } from '@/components/ui/stage-patch'
import { dayAndMonth } from '@/lib/dates/rules'
import { stageCode } from '@/lib/seasons/rules'
import type { WindowView } from '@/lib/seasons/views'
import type { Crop } from '@/lib/topics/crops'
import { stageWord } from '@/lib/topics/stage-words'
import type { Shape } from './board-geometry'

type LaneWindowProps = { window: WindowView; crop: Crop; shape: Shape; episodesHref: string }

/**
 * One stage on a lane. The word stands on a plate and drops out of sight where the stage is too short for it: it wraps
 * to a second line that is cut off, so that no word is ever cut in half.
 */
export function LaneWindow({ window, crop, shape, episodesHref }: LaneWindowProps) {
  const word = stageWord(window.stage, crop)
  const days = `${dayAndMonth(window.startsOn)} to ${dayAndMonth(window.endsOn)}`
  return (
    <li
      className="absolute bottom-4 h-9 border-r-2 border-sheet"
      style={{ left: `${shape.left}%`, width: `${shape.width}%` }}
    >
      <Link
        href={`${episodesHref}&stage=${stageCode(crop, window.stage)}`}
        aria-label={`${word}, ${days}: see the episodes`}
        title={`${word}, ${days}`}
        className="relative block size-full text-ink no-underline hover:z-10 hover:outline-3 hover:outline-ink"
      >
        <StagePatch stage={window.stage} className="absolute inset-0 size-full" />
        <span className="absolute inset-x-[3px] inset-y-1.5 flex flex-wrap overflow-hidden" aria-hidden="true">
          <span className="h-full w-px" />
          <span className="h-full bg-sheet px-1 text-[0.8125rem] leading-6 font-semibold whitespace-nowrap">
            {word}
          </span>
        </span>
      </Link>
    </li>
  )
}
