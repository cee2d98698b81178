'use client'

import type { MouseEvent, ReactNode } from 'react'
import { TimeCode } from '@/components/ui/time-code'
import { usePlayback } from './playback-context'

/** True for a press that asks for another tab or window. */
const opensElsewhere = (event: MouseEvent) =>
  event.button !== 0 || event.metaKey || event.ctrlKey || event.shiftKey || event.altKey

type TimeLinkProps = { at: number; className?: string; onGo?: () => void; children?: ReactNode }

/**
 * A second of this episode: moves the film without leaving the page. Without JavaScript, or in a new tab, it opens the
 * page at that second.
 */
export function TimeLink({ at, className, onGo, children }: TimeLinkProps) {
  const playback = usePlayback()
  const go = (event: MouseEvent) => {
    if (opensElsewhere(event)) return
    event.preventDefault()
    playback.seek(at)
    onGo?.()
  }
  return (
    <a href={`?t=${Math.floor(at)}`} onClick={go} className={className}>
      {children ?? <TimeCode seconds={at} />}
    </a>
  )
}
