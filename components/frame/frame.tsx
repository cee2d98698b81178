import type { ReactNode } from 'react'
import { Footer } from './footer'
import type { FramePerson } from './frame-person'
import { SiteHeader } from './site-header'
import { SkipLink, contentId } from './skip-link'

/** The main part of a page, which the skip link leads to. */
export function Main({ children }: { children: ReactNode }) {
  return (
    <main id={contentId} tabIndex={-1} className="flex-1 pb-12 focus:outline-none">
      {children}
    </main>
  )
}

/** The bars around a page. What is put in brings its own `Main`: a desk has one more bar before it. */
export function Frame({ person, children }: { person: FramePerson | null; children: ReactNode }) {
  return (
    <>
      <SkipLink />
      <SiteHeader person={person} />
      {children}
      <Footer />
    </>
  )
}
