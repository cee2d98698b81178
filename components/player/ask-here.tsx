'use client'

import { ButtonLink } from '@/components/ui/button'
import { timeCode } from '@/lib/times/rules'
import { useMoment, wholeSecond } from './playback-context'

type AskHereProps = { episodeId: string; askName: string; className?: string }

/** Asks the farmer about the very second that is being watched. */
export function AskHere({ episodeId, askName, className }: AskHereProps) {
  const second = useMoment(wholeSecond)
  return (
    // A link that changes every second is not worth fetching ahead.
    <ButtonLink href={`/questions/ask?episode=${episodeId}&t=${second}`} prefetch={false} className={className}>
      Ask {askName} at {timeCode(second)}
    </ButtonLink>
  )
}
