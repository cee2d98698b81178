'use client'

import { useEffect, useRef, type ReactNode } from 'react'

/** The box the lanes scroll in where the screen is narrower than the year; it opens with today in the middle. */
export function BoardScroller({ today, children }: { today: number | null; children: ReactNode }) {
  const box = useRef<HTMLDivElement>(null)
  useEffect(() => {
    const { current } = box
    if (!current || today === null) return
    current.scrollLeft = (current.scrollWidth * today) / 100 - current.clientWidth / 2
  }, [today])
  return (
    <div ref={box} role="region" aria-label="Season board" tabIndex={0} className="overflow-x-auto">
      <div className="min-w-[58rem]">{children}</div>
    </div>
  )
}
