import Link from 'next/link'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { isNarrowed, searchHref } from '@/lib/search/address-rules'
import type { SearchQuery } from '@/lib/search/schema'

type NothingFoundProps = { query: SearchQuery; near: { label: string; url: string }[] }

/** Nothing was found: what to try, from the nearest to the farthest. */
export function NothingFound({ query, near }: NothingFoundProps) {
  const narrowed = isNarrowed(query)
  return (
    <EmptyState
      title={query.q ? `Nothing found for “${query.q}”` : 'Nothing is filed under this yet'}
      action={
        <>
          {narrowed && query.q && (
            <ButtonLink href={searchHref({ q: query.q, limit: query.limit })} variant="line">
              Find “{query.q}” everywhere
            </ButtonLink>
          )}
          <ButtonLink href="/questions/ask" variant="line">
            Ask a farmer
          </ButtonLink>
        </>
      }
    >
      {near.length > 0 && (
        <p>
          The handbook has words that look like it:{' '}
          {near.map(({ label, url }, at) => (
            <span key={url}>
              {at > 0 && ', '}
              <Link href={url}>{label}</Link>
            </span>
          ))}
          .
        </p>
      )}
      <p className={near.length > 0 ? 'mt-2' : undefined}>
        Try fewer or plainer words{narrowed ? ', or take a choice back' : ''}. If nobody has shown it yet, a question
        may bring it into a coming episode.
      </p>
    </EmptyState>
  )
}
