'use client'

import Link from 'next/link'
import { Button, ButtonLink } from '@/components/ui/button'
import { Mark } from '@/components/ui/mark'

/** The last resort of a page: what happened, what is safe, what to do. */
export default function PageFailed({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <>
      <header className="on-dark bg-loam text-on-loam">
        <div className="page flex h-13 items-center md:h-15">
          <Link
            href="/"
            className="flex min-h-11 items-center gap-3 font-display text-xl font-semibold text-on-loam no-underline"
          >
            <Mark />
            Turnrow
          </Link>
        </div>
      </header>
      <main id="content" className="page flex-1 py-10">
        <h1>This page did not come through</h1>
        <p className="mt-3 max-w-measure text-ink-2">
          Something on our side failed while it was put together. What was saved before is safe; what you had typed on
          this page may have to be typed again.
        </p>
        {error.digest && (
          <p className="mt-3 text-sm text-ink-3">
            If you report it, give this number: <span className="font-mono">{error.digest}</span>
          </p>
        )}
        <div className="mt-6 flex flex-wrap gap-2.5">
          <Button onClick={reset}>Try again</Button>
          <ButtonLink href="/" variant="line">
            See the farms
          </ButtonLink>
        </div>
      </main>
    </>
  )
}
