import type { ReactNode } from 'react'
import { StagePatch } from './stage-patch'

type EmptyStateProps = { title: ReactNode; children?: ReactNode; action?: ReactNode; level?: 2 | 3 }

/** A page or list with nothing in it yet, drawn as ground that is not sown: what will be here, and how to begin. */
export function EmptyState({ title, children, action, level = 2 }: EmptyStateProps) {
  const Heading = `h${level}` as const
  return (
    <div className="sheet">
      <StagePatch stage="soil" className="h-3 w-full opacity-70" />
      <div className="px-5 py-7 md:px-8 md:py-9">
        <Heading>{title}</Heading>
        {children && <div className="mt-2 max-w-measure text-ink-2">{children}</div>}
        {action && <div className="mt-5 flex flex-wrap gap-2.5">{action}</div>}
      </div>
    </div>
  )
}
