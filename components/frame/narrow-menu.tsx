'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import type { ReactNode } from 'react'
import { siteLinks } from './nav-links'
import { SearchForm } from './search-form'

const summary =
  'flex min-h-13 items-center px-2 font-semibold text-on-loam md:min-h-11 md:text-sm group-open:underline group-open:decoration-2'
const panel = 'absolute inset-x-0 top-full z-30 border-b border-loam-rule bg-loam px-3.5 pt-1 pb-4'

/**
 * Find and Menu on a narrow screen; on a middling one Find alone, for want of room for its field. `<details>` of one
 * name: one closes the other, without any script. The key closes both when a link has brought another page.
 */
export function NarrowMenu({ children }: { children: ReactNode }) {
  const pathname = usePathname()
  return (
    <div key={pathname} className="-mr-2 ml-auto flex lg:hidden">
      <details name="narrow-menu" className="group">
        <summary className={summary}>Find</summary>
        <div className={panel}>
          <SearchForm withButton />
        </div>
      </details>
      <details name="narrow-menu" className="group md:hidden">
        <summary className={summary}>Menu</summary>
        <div className={panel}>
          <nav aria-label="Main">
            <ul className="divide-y divide-loam-2">
              {siteLinks(pathname).map(({ href, label, current }) => (
                <li key={href}>
                  <Link
                    href={href}
                    aria-current={current}
                    className="flex min-h-12 items-center text-on-loam no-underline aria-[current]:font-bold aria-[current]:underline aria-[current]:decoration-2"
                  >
                    {label}
                  </Link>
                </li>
              ))}
            </ul>
          </nav>
          {children}
        </div>
      </details>
    </div>
  )
}
