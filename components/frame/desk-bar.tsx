'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { useEffect, useRef } from 'react'
import { deskLinks } from './nav-links'

type DeskBarProps = {
  channel: { slug: string; name: string }
  /** Whether the way to the channel's people stands here; only its owners have it. */
  people: boolean
}

/** The second bar: one channel's workspace. */
export function DeskBar({ channel, people }: DeskBarProps) {
  const pathname = usePathname()
  const links = deskLinks(pathname, channel.slug, people)
  const bar = useRef<HTMLDivElement>(null)
  useEffect(() => {
    // On a phone the bar is wider than the screen: the part one is in has to be in sight.
    const here = bar.current?.querySelector<HTMLElement>('[aria-current]')
    if (here && bar.current) bar.current.scrollLeft = here.offsetLeft - (bar.current.clientWidth - here.clientWidth) / 2
  }, [pathname])
  return (
    <nav aria-label={`${channel.name} desk`} className="no-print border-b border-rule bg-sheet">
      <div className="page flex flex-wrap items-center gap-x-7 md:flex-nowrap">
        <p className="pt-2.5 font-display text-lg font-semibold whitespace-nowrap md:pt-0">{channel.name} desk</p>
        <div ref={bar} className="relative min-w-0 overflow-x-auto">
          <ul className="flex gap-7">
            {links.map(({ href, label, current }) => (
              <li key={href}>
                <Link
                  href={href}
                  aria-current={current}
                  className="flex h-13.5 items-center whitespace-nowrap text-ink-2 no-underline hover:text-ink hover:no-underline aria-[current]:font-semibold aria-[current]:text-ink aria-[current]:shadow-[inset_0_-3px_0_var(--color-act)]"
                >
                  {label}
                </Link>
              </li>
            ))}
          </ul>
        </div>
      </div>
    </nav>
  )
}
