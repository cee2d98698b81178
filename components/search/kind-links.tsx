import Link from 'next/link'
import { classNames } from '@/components/ui/class-names'
import { searchHref } from '@/lib/search/address-rules'
import { searchKinds, type SearchQuery, type SearchResult } from '@/lib/search/schema'
import { kindWords } from './kind-words'

const look =
  'inline-flex min-h-11 items-center gap-1.5 border-b-[3px] px-2.5 text-ink no-underline hover:underline hover:decoration-2'

/** What kinds of things were found, with how many of each; links, so that the address says what is shown. */
export function KindLinks({ query, counts }: { query: SearchQuery; counts: SearchResult['facets']['kind'] }) {
  const kinds = searchKinds.filter((kind) => counts[kind] !== undefined || query.kind === kind)
  const all = Object.values(counts).reduce((sum, count) => sum + count, 0)
  const entries = [
    { kind: undefined, words: 'Everything', count: all },
    ...kinds.map((kind) => ({ kind, words: kindWords[kind], count: counts[kind] ?? 0 })),
  ]
  return (
    <nav aria-label="Kinds of results" className="border-b border-rule-2 px-1 md:px-2">
      <ul className="flex flex-wrap">
        {entries.map(({ kind, words, count }) => {
          const current = query.kind === kind
          return (
            <li key={words}>
              <Link
                href={searchHref(query, { kind })}
                aria-current={current ? 'true' : undefined}
                className={classNames(look, current ? 'border-act font-semibold' : 'border-transparent')}
              >
                {words} <span className="text-sm font-normal text-ink-3 tabular-nums">{count}</span>
              </Link>
            </li>
          )
        })}
      </ul>
    </nav>
  )
}
