'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { siteLinks } from './nav-links'

/** The parts of the place one is in, along the bar. */
export function SiteNav() {
  const links = siteLinks(usePathname())
  return (
    <nav aria-label="Main" className="hidden md:block">
      <ul className="flex gap-5 lg:gap-6.5">
        {links.map(({ href, label, current }) => (
          <li key={href}>
            <Link
              href={href}
              aria-current={current}
              className="flex h-15 items-center text-[1rem] text-on-loam-2 no-underline hover:text-on-loam hover:no-underline aria-[current]:text-on-loam aria-[current]:shadow-[inset_0_-3px_0_var(--color-on-loam)]"
            >
              {label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  )
}
