'use client'

import Link from 'next/link'
import { signOut } from 'next-auth/react'
import { classNames } from '@/components/ui/class-names'
import type { FramePerson } from './frame-person'

const item = 'flex min-h-12 items-center text-left text-on-loam no-underline hover:underline'

/** Everything that is a person's own: their desks, and the way out. */
export function PersonLinks({ person, className }: { person: FramePerson | null; className?: string }) {
  if (!person) {
    return (
      <div className={className}>
        <Link href="/sign-in" className={item}>
          Sign in
        </Link>
      </div>
    )
  }
  return (
    <ul className={classNames('divide-y divide-loam-2', className)}>
      {person.desks.map(({ slug, name }) => (
        <li key={slug}>
          <Link href={`/desk/${slug}`} className={item}>
            {name} desk
          </Link>
        </li>
      ))}
      {person.isAdmin && (
        <li>
          <Link href="/admin" className={item}>
            This installation
          </Link>
        </li>
      )}
      <li>
        <Link href="/account" className={item}>
          Your account
        </Link>
      </li>
      <li>
        <SignOut className={item} />
      </li>
    </ul>
  )
}

/** Without a script the form leads to a page that asks once more; reading an address must not end a session by itself. */
function SignOut({ className }: { className: string }) {
  return (
    <form
      action="/api/auth/signout"
      method="get"
      onSubmit={(event) => {
        event.preventDefault()
        void signOut({ callbackUrl: '/' })
      }}
    >
      <button type="submit" className={classNames(className, 'w-full')}>
        Sign out
      </button>
    </form>
  )
}
