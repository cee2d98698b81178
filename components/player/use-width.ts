'use client'

import { useEffect, useState, type RefObject } from 'react'

/** The width of an element in CSS px, kept up to date; `assumed` until it has been drawn. */
export function useWidth(element: RefObject<HTMLElement | null>, assumed: number): number {
  const [width, setWidth] = useState(assumed)
  useEffect(() => {
    if (!element.current) return
    const observer = new ResizeObserver(([entry]) => entry && setWidth(entry.contentRect.width))
    observer.observe(element.current)
    return () => observer.disconnect()
  }, [element])
  return width
}
