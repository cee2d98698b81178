import { isoDuration, timeCode } from '@/lib/times/rules'
import { classNames } from './class-names'

/** A position in an episode, in seconds, set as m:ss in figures of one width. */
export function TimeCode({ seconds, className }: { seconds: number; className?: string }) {
  return (
    <time dateTime={isoDuration(seconds)} className={classNames('font-mono tabular-nums', className)}>
      {timeCode(seconds)}
    </time>
  )
}
