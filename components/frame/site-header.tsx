import Link from 'next/link'
import { Mark } from '@/components/ui/mark'
import type { FramePerson } from './frame-person'
import { NarrowMenu } from './narrow-menu'
import { PersonLinks } from './person-links'
import { PersonMenu } from './person-menu'
import { SearchForm } from './search-form'
import { SiteNav } from './site-nav'

/** The bar over every page. */
export function SiteHeader({ person }: { person: FramePerson | null }) {
  return (
    <header className="no-print on-dark relative bg-loam text-on-loam">
      <div className="page flex h-13 items-center gap-6 md:h-15 lg:gap-9">
        <Link
          href="/"
          className="flex min-h-11 items-center gap-3 font-display text-[1.25rem] font-semibold text-on-loam no-underline hover:no-underline md:text-[1.4375rem]"
        >
          <Mark />
          Turnrow
        </Link>
        <SiteNav />
        <SearchForm className="ml-auto hidden w-75 min-w-0 shrink lg:flex" />
        <NarrowMenu>
          <PersonLinks person={person} className="border-t border-loam-rule" />
        </NarrowMenu>
        <PersonMenu person={person} />
      </div>
    </header>
  )
}
