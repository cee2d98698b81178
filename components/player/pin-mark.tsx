import { classNames } from '@/components/ui/class-names'
import type { Pin } from './row-rules'

/** The four marks: a gauge, a pennant that is solid when answered and open while waiting, a pencil's tick. */
export function PinMark({ kind, className }: { kind: Pin['kind']; className?: string }) {
  return (
    <svg viewBox="0 0 24 24" className={classNames('block size-[24px] shrink-0', className)} aria-hidden="true">
      {kind === 'reading' && (
        <>
          <rect
            x="8"
            y="2"
            width="8"
            height="20"
            className="fill-sheet stroke-water forced-colors:fill-[Canvas] forced-colors:stroke-[CanvasText]"
            strokeWidth="2"
          />
          <rect x="9" y="12" width="6" height="9" className="fill-water forced-colors:fill-[CanvasText]" />
        </>
      )}
      {(kind === 'answered' || kind === 'waiting') && (
        <path
          d="M11 23V3h12l-3.5 4.8L23 12.5H11"
          strokeWidth="2"
          className={classNames(
            'stroke-flag forced-colors:stroke-[CanvasText]',
            kind === 'answered'
              ? 'fill-flag forced-colors:fill-[CanvasText]'
              : 'fill-sheet forced-colors:fill-[Canvas]',
          )}
        />
      )}
      {kind === 'correction' && (
        <path
          d="M4.5 13.5l5.2 6.2Q12.5 11 20 4"
          fill="none"
          strokeWidth="2.6"
          strokeLinecap="round"
          className="stroke-ink forced-colors:stroke-[CanvasText]"
        />
      )}
    </svg>
  )
}
