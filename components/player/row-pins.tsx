import { PinMark } from './pin-mark'
import { rowShare, type Pin } from './row-rules'

/** Height of a lane of pins, in CSS px. */
export const laneHeight = 26

type RowPinsProps = {
  pins: Pin[]
  lanes: number[]
  duration: number
  onChoose: (pin: Pin) => void
}

/** Each pin stands over its second; one that would cover another stands a lane higher on a longer stem. */
export function RowPins({ pins, lanes, duration, onChoose }: RowPinsProps) {
  const height = (Math.max(0, ...lanes) + 1) * laneHeight
  return (
    <ul className="relative mb-1.5" style={{ height }}>
      {pins.map((pin, at) => {
        const lane = lanes[at] ?? 0
        return (
          <li
            key={pin.key}
            className="absolute -translate-x-1/2"
            style={{ left: rowShare(pin.at, duration), bottom: lane * laneHeight }}
          >
            {lane > 0 && (
              <span
                aria-hidden="true"
                className="absolute top-full left-1/2 border-l border-ink-3"
                style={{ height: lane * laneHeight }}
              />
            )}
            <button
              type="button"
              aria-label={pin.name}
              title={pin.name}
              onClick={() => onChoose(pin)}
              className="block"
            >
              <PinMark kind={pin.kind} />
            </button>
          </li>
        )
      })}
    </ul>
  )
}
