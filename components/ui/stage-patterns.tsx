import type { ReactNode } from 'react'
import { stageKeys, type StageKey } from '@/lib/topics/stage-words'

const thin = { strokeWidth: 1.4 }
const thick = { strokeWidth: 1.6 }

/** One tile of 12 × 12 per stage, drawn like the patterns of a geological map: what is seen in the field then. */
const marks: Record<StageKey, ReactNode> = {
  soil: <path className="line" d="M0 12L12 0M-3 3L3 -3M9 15L15 9" {...thick} />,
  0: <path className="dot" d="M3 1.4a1.6 1.6 0 1 0 .01 0zM9 7.4a1.6 1.6 0 1 0 .01 0z" />,
  1: <path className="line" d="M3 8V4M9 12V8" {...thick} />,
  2: <path className="line" d="M2 9l2-4 2 4M8 4l2-4 2 4" {...thin} />,
  3: <path className="line" d="M3 0V12M9 0V12" {...thin} />,
  4: <path className="line" d="M6 1.5q3.6 4.5 0 9q-3.6-4.5 0-9zM0 7.5q1.8 2.2 0 4.5M12 7.5q-1.8 2.2 0 4.5" {...thin} />,
  5: <path className="line" d="M0 6L3 2L6 6L9 2L12 6M0 12L3 8L6 12L9 8L12 12" strokeWidth="1.2" />,
  6: <path className="line" d="M6 3.6a2.4 2.4 0 1 0 .01 0z" strokeWidth="1.3" />,
  7: <path className="dot" d="M3 1.4a1.4 2.6 0 1 0 .01 0zM9 6.4a1.4 2.6 0 1 0 .01 0z" />,
  8: (
    <>
      <path className="dot" d="M3 1.2a1.6 2.6 0 1 0 .01 0zM9 7.2a1.6 2.6 0 1 0 .01 0z" />
      <path className="line" d="M3 6V9.5M9 0V3.5" strokeWidth="1.2" />
    </>
  ),
  9: <path className="line" d="M2 12V7M6 12V8M10 12V7" {...thick} />,
}

const inks: Record<StageKey, string> = {
  soil: '[--patch:var(--color-stage-soil)]',
  0: '[--patch:var(--color-stage-0)] [--patch-mark:rgb(59_42_23/.6)]',
  1: '[--patch:var(--color-stage-1)] [--patch-mark:rgb(28_58_23/.65)]',
  2: '[--patch:var(--color-stage-2)]',
  3: '[--patch:var(--color-stage-3)]',
  4: '[--patch:var(--color-stage-4)]',
  5: '[--patch:var(--color-stage-5)]',
  6: '[--patch:var(--color-stage-6)] [--patch-mark:rgb(255_255_255/.75)]',
  7: '[--patch:var(--color-stage-7)]',
  8: '[--patch:var(--color-stage-8)] [--patch-mark:rgb(90_61_5/.65)]',
  9: '[--patch:var(--color-stage-9)]',
}

/** The address of a stage's pattern on the page. */
export const patternOf = (stage: StageKey) => `stage-pattern-${stage}`

/**
 * The patterns themselves, once on every page. Each patch with a pattern of its own cost ids that clash when a page is
 * left for another, and browsers draw nothing from a pattern whose first owner is hidden. Not `display: none`, for the
 * same reason.
 */
export function StagePatterns() {
  return (
    <svg aria-hidden="true" className="pointer-events-none absolute size-0">
      <defs>
        {stageKeys.map((stage) => (
          <pattern
            key={stage}
            id={patternOf(stage)}
            className={`stage-patch ${inks[stage]}`}
            width="12"
            height="12"
            patternUnits="userSpaceOnUse"
          >
            <rect className="ground" width="12" height="12" />
            {marks[stage]}
          </pattern>
        ))}
      </defs>
    </svg>
  )
}
