'use client'

import Link from 'next/link'
import { Popover } from 'radix-ui'
import { useId, useRef, useState, type MouseEvent, type ReactNode } from 'react'
import type { TermNote } from '@/lib/handbook/views'
import { TermSheet } from './term-sheet'

const opensElsewhere = (event: MouseEvent) =>
  event.button !== 0 || event.metaKey || event.ctrlKey || event.shiftKey || event.altKey

/**
 * A term in running text. A tap, click or Enter opens its sheet beside it; Esc or a tap elsewhere closes it and the
 * focus comes back. Without JavaScript, or opened in a new tab, it is a link to the term's page.
 */
export function TermLink({ note, children }: { note: TermNote; children: ReactNode }) {
  const [open, setOpen] = useState(false)
  const link = useRef<HTMLAnchorElement>(null)
  const headingId = useId()
  const leftByPointer = useRef(false)

  function toggle(event: MouseEvent) {
    // The sentence around a term may be a control of its own (it seeks); a term's tap is the term's alone.
    event.stopPropagation()
    if (opensElsewhere(event)) return
    event.preventDefault()
    setOpen(!open)
  }

  return (
    <Popover.Root open={open} onOpenChange={setOpen}>
      <Popover.Anchor asChild>
        <Link
          ref={link}
          href={`/handbook/terms/${note.slug}`}
          prefetch={false}
          className="term"
          aria-haspopup="dialog"
          aria-expanded={open}
          onClick={toggle}
        >
          {children}
        </Link>
      </Popover.Anchor>
      <Popover.Portal>
        <Popover.Content
          aria-labelledby={headingId}
          sideOffset={6}
          collisionPadding={12}
          className="z-50 w-80 max-w-[calc(100vw-1.5rem)] focus:outline-none"
          onClick={(event) => event.stopPropagation()}
          onOpenAutoFocus={() => (leftByPointer.current = false)}
          onInteractOutside={(event) => {
            // Pressing the term again is for its own click to answer; closing here would only open it again.
            if (event.target instanceof Node && link.current?.contains(event.target)) event.preventDefault()
            else leftByPointer.current = true
          }}
          onCloseAutoFocus={(event) => {
            event.preventDefault()
            if (!leftByPointer.current) link.current?.focus({ preventScroll: true })
          }}
        >
          <TermSheet note={note} headingId={headingId} />
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  )
}
