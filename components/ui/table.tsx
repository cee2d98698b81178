import type { ComponentProps, ReactNode } from 'react'
import { classNames } from './class-names'

type TableProps = {
  /** What the table holds; read out, and shown when `showCaption` is set. */
  caption: string
  showCaption?: boolean
  children: ReactNode
  className?: string
}

/** A ruled table on a sheet. Too wide for the screen, it scrolls inside its own box, from the keyboard too. */
export function Table({ caption, showCaption, children, className }: TableProps) {
  return (
    <div role="region" aria-label={caption} tabIndex={0} className="sheet relative overflow-x-auto">
      <table className={classNames('w-full border-collapse text-left', className)}>
        <caption className={showCaption ? 'px-3.5 py-2.5 text-left font-semibold' : 'sr-only'}>{caption}</caption>
        {children}
      </table>
    </div>
  )
}

/** A column's heading. */
export function HeadCell({ className, ...rest }: ComponentProps<'th'>) {
  return (
    <th
      scope="col"
      {...rest}
      className={classNames('border-b border-rule px-3.5 py-2.5 text-sm font-medium text-ink-3', className)}
    />
  )
}

/** A row; `chosen` when its thing stands open beside the table. */
export function Row({ chosen, className, ...rest }: ComponentProps<'tr'> & { chosen?: boolean }) {
  return (
    <tr
      {...rest}
      aria-current={chosen ? 'true' : undefined}
      className={classNames('border-b border-rule-2 align-top last:border-0', chosen && 'bg-mist', className)}
    />
  )
}

export function Cell({ className, ...rest }: ComponentProps<'td'>) {
  return <td {...rest} className={classNames('px-3.5 py-3', className)} />
}
