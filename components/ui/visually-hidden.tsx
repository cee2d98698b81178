import type { ReactNode } from 'react'

/** Words for a screen reader that the eye gets from the drawing. */
export function VisuallyHidden({ children }: { children: ReactNode }) {
  return <span className="sr-only">{children}</span>
}
