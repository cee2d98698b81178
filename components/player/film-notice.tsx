'use client'

import { Button } from '@/components/ui/button'
import { usePlayback, useMoment } from './playback-context'

const plate = 'absolute bottom-3 left-3 border border-loam-rule bg-loam px-3 py-1.5 text-sm text-on-loam'

/** What stands over the picture when there is something to say about it. */
export function FilmNotice({ soundOnly }: { soundOnly: boolean }) {
  const playback = usePlayback()
  const phase = useMoment((moment) => moment.phase)
  const playing = useMoment((moment) => moment.playing)
  if (phase === 'broken') return <BrokenFilm onRetry={() => void playback.play()} />
  const words =
    phase === 'mending'
      ? 'The line dropped. Trying again'
      : playing && (phase === 'waiting' || phase === 'loading')
        ? 'Waiting for the line'
        : null
  return (
    <>
      {soundOnly && phase !== 'resting' && (
        <p className="pointer-events-none absolute inset-0 grid place-items-center bg-loam text-on-loam">
          Sound only, the picture is off
        </p>
      )}
      <div role="status" className="pointer-events-none">
        {words && <p className={plate}>{words}</p>}
      </div>
    </>
  )
}

function BrokenFilm({ onRetry }: { onRetry: () => void }) {
  return (
    <div role="alert" className="absolute inset-0 grid place-items-center overflow-auto bg-loam p-4">
      <div className="max-w-md border-[1.5px] border-ink bg-sheet p-4 text-ink">
        <p className="font-semibold">The film does not come through</p>
        <p className="mt-1 mb-3 text-sm">
          The text as spoken, readings and questions still work. Your place is kept. When your line is back, the film
          goes on by itself, or try now.
        </p>
        <Button onClick={onRetry}>Try again</Button>
      </div>
    </div>
  )
}
