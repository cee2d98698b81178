'use client'

import { useMoment, usePlayback } from '@/components/player/playback-context'
import { Button } from '@/components/ui/button'
import { writeTime } from '@/lib/times/parse'
import { type ChapterDraft, startHere } from './chapter-draft'

/** One frame of a 25 fps film: fine enough to land on the cut. */
const NUDGE_SECONDS = 0.04
const tenth = (at: number) => Math.round(at * 10) / 10

/** Starts a chapter at the second that is watched. */
export function StartHere({
  drafts,
  onChange,
}: {
  drafts: ChapterDraft[]
  onChange: (drafts: ChapterDraft[]) => void
}) {
  const playback = usePlayback()
  const at = useMoment((moment) => tenth(moment.at))
  return (
    <div className="flex flex-wrap items-center gap-2.5 p-4">
      <Button variant="line" onClick={() => onChange(startHere(drafts, at))}>
        Start a chapter here
      </Button>
      <span className="font-mono tabular-nums">{writeTime(at)}</span>
      <Button variant="quiet" onClick={() => playback.step(-NUDGE_SECONDS)}>
        One frame back
      </Button>
      <Button variant="quiet" onClick={() => playback.step(NUDGE_SECONDS)}>
        One frame on
      </Button>
    </div>
  )
}
