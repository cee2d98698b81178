'use client'

import { Dialog as Radix } from 'radix-ui'
import type { ReactNode } from 'react'
import { classNames } from './class-names'
import { buttonClass } from './button'

type DialogProps = {
  open?: boolean
  onOpenChange?: (open: boolean) => void
  /** The button that opens it; focus comes back here. Leave out when `open` is set from outside. */
  trigger?: ReactNode
  title: ReactNode
  description?: ReactNode
  children: ReactNode
  /** The word on the way out. */
  closeLabel?: string
  className?: string
}

/** A sheet laid over the page: from the foot of a phone's screen, in the middle of a wider one. */
export function Dialog({
  open,
  onOpenChange,
  trigger,
  title,
  description,
  children,
  closeLabel = 'Close',
  className,
}: DialogProps) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      {trigger && <Radix.Trigger asChild>{trigger}</Radix.Trigger>}
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-loam/60" />
        <Radix.Content
          // Radix warns about a missing description unless told that none is meant.
          {...(description ? {} : { 'aria-describedby': undefined })}
          className={classNames(
            'fixed inset-x-0 bottom-0 z-50 max-h-[92dvh] overflow-y-auto border-[1.5px] border-ink bg-sheet p-5 md:inset-auto md:top-1/2 md:left-1/2 md:w-[min(36rem,calc(100vw-3rem))] md:-translate-x-1/2 md:-translate-y-1/2 md:p-6',
            className,
          )}
        >
          <div className="mb-4 flex items-start justify-between gap-4">
            <Radix.Title className="text-xl">{title}</Radix.Title>
            <Radix.Close className={buttonClass('quiet', '-my-2.5 -mr-2 shrink-0')}>{closeLabel}</Radix.Close>
          </div>
          {description && <Radix.Description className="mb-4 text-ink-2">{description}</Radix.Description>}
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
