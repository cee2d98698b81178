import Link from 'next/link'
import { classNames } from '@/components/ui/class-names'
import { laneHeight } from './row-pins'
import { rowShare, type Pin } from './row-rules'

/** Height of the line over the pins that carries the words, in CSS px. */
const lineHeight = 26
/** How wide the two rows turn, in CSS px. */
const bend = 9
const apart = 4

type RowTurnProps = { pin: Pin | null; pins: Pin[]; lanes: number[]; duration: number; width: number }

/**
 * Signature 1: the question goes out at its pin, turns round as two rows do at the headland, and comes back at the
 * second of the follow-up. The line keeps its height when no turn is drawn, so that nothing jumps.
 */
export function RowTurn({ pin, pins, lanes, duration, width }: RowTurnProps) {
  const at = pin ? pins.indexOf(pin) : -1
  if (!pin?.turn || at === -1) return <div style={{ height: lineHeight }} />
  const highest = Math.max(0, ...lanes)
  const drop = lineHeight / 2 + (highest - (lanes[at] ?? 0)) * laneHeight + laneHeight / 2
  // The words go where there is room for them.
  const leftwards = pin.at > duration / 2
  const edge = `calc(${rowShare(pin.at, duration)} + ${leftwards ? 12 : -1}px)`
  return (
    <div className="relative text-sm" style={{ height: lineHeight }}>
      <div
        className={classNames('absolute top-0 flex h-full items-center', leftwards && 'flex-row-reverse')}
        style={leftwards ? { left: 0, right: `calc(100% - ${edge})` } : { left: edge, right: 0 }}
      >
        <svg
          width="8"
          height={drop + lineHeight / 2}
          className={classNames(
            'pointer-events-none shrink-0 self-start overflow-visible stroke-flag forced-colors:stroke-[CanvasText]',
            leftwards && '-scale-x-100',
          )}
          fill="none"
          strokeWidth="1.8"
          aria-hidden="true"
        >
          <path d={turnPath(drop, 0)} />
          <path d={turnPath(drop, apart)} />
        </svg>
        <Link href={pin.turn.url} className="mx-1.5 min-w-0 truncate bg-sheet px-1">
          {width >= 480 ? 'Answered in ' : 'In '}
          {pin.turn.words}
        </Link>
      </div>
    </div>
  )
}

/** One row of the turn: out to the side, round, and back; `inset` makes the inner of the two. */
function turnPath(drop: number, inset: number): string {
  const radius = bend - inset
  const top = lineHeight / 2 - bend / 2 + inset
  const bottom = lineHeight / 2 + drop - inset
  return `M0 ${bottom}h-1a${radius} ${radius} 0 0 1 -${radius} -${radius}V${top + radius}a${radius} ${radius} 0 0 1 ${radius} -${radius}H8`
}
