'use client'

import { useEffect, useRef, type ReactNode } from 'react'

type BoardScrollerProps = {
  /** Where to open, in percent of the year: at what there is to see. */
  openAt: number | null
  children: ReactNode
}

/** The box the lanes scroll in where the screen is narrower than the year. */
export function BoardScroller({ openAt, children }: BoardScrollerProps) {
  const box = useRef<HTMLDivElement>(null)
  useEffect(() => {
    const { current } = box
    if (!current || openAt === null) return
    current.scrollLeft = (current.scrollWidth * openAt) / 100 - current.clientWidth / 2
  }, [openAt])
  return (
    <div ref={box} role="region" aria-label="Season board" tabIndex={0} className="overflow-x-auto">
      <div className="min-w-[58rem]">{children}</div>
    </div>
  )
}
