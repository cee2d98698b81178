import type { ReactNode } from 'react'
import { stageWord, type StageKey } from '@/lib/topics/stage-words'
import type { Crop } from '@/lib/topics/crops'
import { classNames } from './class-names'
import { StagePatch } from './stage-patch'

const plate = 'inline-flex max-w-full items-center gap-1.5 border border-rule bg-sheet text-xs leading-tight text-ink'

/** A short label on a solid plate. */
export function Tag({ children, className }: { children: ReactNode; className?: string }) {
  return <span className={classNames(plate, 'px-2 py-1', className)}>{children}</span>
}

type StageTagProps = {
  stage: StageKey
  crop?: Crop | null
  /** Instead of the stage's own word: "Soybean, side shoots (BBCH 2)". */
  word?: ReactNode
  className?: string
}

/** A stage with its pattern and its word, as it stands in lists and tables. */
export function StageTag({ stage, crop, word, className }: StageTagProps) {
  return (
    <span className={classNames(plate, 'py-0.75 pr-2.25 pl-0.75', className)}>
      <StagePatch stage={stage} />
      <span className="min-w-0">{word ?? stageWord(stage, crop)}</span>
    </span>
  )
}
