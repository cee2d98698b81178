import { classNames } from './class-names'

/** A block of the size that the real thing will have, so that nothing moves when it arrives. */
export function Skeleton({ className = 'h-5 w-full' }: { className?: string }) {
  return <div aria-hidden="true" className={classNames('bg-rule-2 motion-safe:animate-pulse', className)} />
}

const widths = ['w-11/12', 'w-full', 'w-4/5', 'w-10/12', 'w-3/5']

/** Lines of text on their way, with the words for those who cannot see them. */
export function SkeletonLines({ lines = 3, label }: { lines?: number; label: string }) {
  return (
    <div role="status" className="space-y-3">
      <span className="sr-only">{label}</span>
      {Array.from({ length: lines }, (_, line) => (
        <Skeleton key={line} className={classNames('h-4.5', widths[line % widths.length])} />
      ))}
    </div>
  )
}
