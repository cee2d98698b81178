'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { shortName, type FramePerson } from './frame-person'
import { channelOf } from './nav-links'
import { PersonLinks } from './person-links'

const link = 'flex min-h-11 items-center text-sm text-on-loam-2 no-underline hover:text-on-loam hover:underline'

/** The right end of the bar: the way in, or the person and the way to their desk. */
export function PersonMenu({ person }: { person: FramePerson | null }) {
  const pathname = usePathname()
  if (!person) {
    return (
      <Link href="/sign-in" className={`${link} hidden whitespace-nowrap md:flex`}>
        Sign in
      </Link>
    )
  }
  const here = channelOf(pathname)
  const desk = person.desks.find(({ slug }) => slug === here) ?? person.desks[0]
  return (
    <div className="hidden items-center gap-2 whitespace-nowrap md:flex">
      <details key={pathname} className="group relative">
        <summary className={`${link} gap-1.5 group-open:underline`}>{shortName(person.name)}</summary>
        <div className="absolute top-full right-0 z-30 min-w-56 border border-loam-rule bg-loam px-4 py-1">
          <PersonLinks person={person} />
        </div>
      </details>
      {desk && (
        <>
          <span aria-hidden="true" className="text-sm text-on-loam-2">
            ·
          </span>
          <Link href={`/desk/${desk.slug}`} className={link}>
            Desk
          </Link>
        </>
      )}
    </div>
  )
}
