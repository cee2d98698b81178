import { ButtonLink } from '@/components/ui/button'
import { searchHref } from '@/lib/search/address-rules'
import type { SearchItem, SearchQuery, SearchResult } from '@/lib/search/schema'
import { KindLinks } from './kind-links'
import { ResultRow } from './result-row'

type SearchResultsProps = { query: SearchQuery; items: SearchItem[]; result: SearchResult | null }

const foundWords = (count: number) => (count === 1 ? '1 place found' : `${count} places found`)

/** What was found, best first, with the kinds above it and the way to more below. */
export function SearchResults({ query, items, result }: SearchResultsProps) {
  return (
    <section aria-label="Results">
      {result && (
        <p role="status" className="mb-2 text-sm text-ink-3">
          {foundWords(result.total)}
          {query.q && ` for “${query.q}”`}
        </p>
      )}
      <div className="sheet">
        {result && <KindLinks query={query} counts={result.facets.kind} />}
        <ol className="ruled">
          {items.map((item) => (
            <ResultRow key={item.id} item={item} />
          ))}
        </ol>
      </div>
      {(result?.nextCursor || query.cursor) && (
        <nav aria-label="More results" className="mt-5 flex flex-wrap gap-2.5">
          {result?.nextCursor && (
            <ButtonLink href={searchHref(query, { cursor: result.nextCursor })} variant="line">
              Show the next {query.limit}
            </ButtonLink>
          )}
          {query.cursor && (
            <ButtonLink href={searchHref(query)} variant="quiet">
              Back to the first
            </ButtonLink>
          )}
        </nav>
      )}
    </section>
  )
}
