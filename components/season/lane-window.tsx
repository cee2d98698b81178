import Link from 'next/link'
import type { ReactNode } from 'react'
import { StagePatch } from '@/components/ui/stage-patch'
import { dayAndMonth } from '@/lib/dates/rules'
import { stageCode } from '@/lib/seasons/rules'
import type { WindowView } from '@/lib/seasons/views'
import type { Crop } from '@/lib/topics/crops'
import { stageWord } from '@/lib/topics/stage-words'
import type { Shape } from './board-geometry'

/** Narrower than this, in per cent of the narrowest track, a press cannot aim (WCAG 2.2, 2.5.8: 24 px). */
const AIMABLE = 3.3

const block = 'relative block size-full text-ink no-underline'

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
      <Block
        href={shape.width < AIMABLE ? null : `${episodesHref}&stage=${stageCode(crop, window.stage)}`}
        words={`${word}, ${days}`}
      >
        <StagePatch stage={window.stage} className="absolute inset-0 size-full" />
        <span className="absolute inset-x-[3px] inset-y-1.5 flex flex-wrap overflow-hidden" aria-hidden="true">
          <span className="h-full w-px" />
          <span className="h-full bg-sheet px-1 text-[0.8125rem] leading-6 font-semibold whitespace-nowrap">
            {word}
          </span>
        </span>
      </Block>
    </li>
  )
}

/** A link where it can be aimed at; a short stage has its link in the list under the board. */
function Block({ href, words, children }: { href: string | null; words: string; children: ReactNode }) {
  if (href === null) {
    return (
      <span title={words} className={block}>
        {children}
        <span className="sr-only">{words}</span>
      </span>
    )
  }
  const label = `${words}: see the episodes`
  return (
    <Link
      href={href}
      aria-label={label}
      title={words}
      className={`${block} hover:z-10 hover:outline-3 hover:outline-ink`}
    >
      {children}
    </Link>
  )
}
