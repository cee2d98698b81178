import type { ReactNode } from 'react'
import { classNames } from './class-names'

export type NoticeTone = 'info' | 'done' | 'failed' | 'offline'

const look: Record<NoticeTone, string> = {
  info: 'border-rule bg-mist',
  done: 'border-act bg-act-tint',
  failed: 'border-fault bg-fault-tint',
  offline: 'border-dashed border-ink bg-sheet',
}

type NoticeProps = {
  tone?: NoticeTone
  title: ReactNode
  /** What is safe, and what to do next. */
  children?: ReactNode
  action?: ReactNode
  className?: string
}

/** Something the person should know. A failure interrupts a screen reader, everything else waits its turn. */
export function Notice({ tone = 'info', title, children, action, className }: NoticeProps) {
  return (
    <div
      role={tone === 'failed' ? 'alert' : 'status'}
      className={classNames('border-[1.5px] px-4 py-3', look[tone], className)}
    >
      <p className={classNames('font-semibold', tone === 'failed' && 'text-fault')}>{title}</p>
      {children && <div className="mt-1 max-w-measure text-ink">{children}</div>}
      {action && <div className="mt-3 flex flex-wrap gap-2.5">{action}</div>}
    </div>
  )
}
