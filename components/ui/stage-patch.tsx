import type { StageKey } from '@/lib/topics/stage-words'
import { classNames } from './class-names'
import { patternOf } from './stage-patterns'

type StagePatchProps = {
  stage: StageKey
  /** Sets the size; without it a swatch of 22 × 18. `absolute inset-0 size-full` fills a block of the row or a lane. */
  className?: string
  /** The stage in words, where no word stands beside the patch. */
  label?: string
}

/**
 * A growth stage as colour and pattern. The word belongs beside it on a solid plate (StageTag), never on the pattern.
 * Inline SVG and not a background: it prints, and keeps its shapes in forced colours.
 */
export function StagePatch({ stage, className = 'h-4.5 w-5.5', label }: StagePatchProps) {
  return (
    <svg
      className={classNames('stage-patch shrink-0', className)}
      role={label ? 'img' : undefined}
      aria-label={label}
      aria-hidden={label ? undefined : true}
    >
      <rect className="edge" width="100%" height="100%" fill={`url(#${patternOf(stage)})`} />
    </svg>
  )
}
