import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { NothingFound } from '@/components/search/nothing-found'
import { SearchBegin } from '@/components/search/search-begin'
import { SearchFields } from '@/components/search/search-fields'
import { SearchResults } from '@/components/search/search-results'
import { Notice } from '@/components/ui/notice'
import { currentActor } from '@/lib/auth/current'
import { forPage } from '@/lib/http/page'
import { asksSomething, searchAsked } from '@/lib/search/address-rules'
import { readSearchPage } from '@/lib/search/page-reads'

type Props = PageProps<'/search'>

export async function generateMetadata({ searchParams }: Props): Promise<Metadata> {
  const { query } = searchAsked(await searchParams)
  return { title: query.q ? `Find “${query.q}”` : 'Find', robots: { index: false } }
}

export default async function SearchPage({ searchParams }: Props) {
  const { query, dropped } = searchAsked(await searchParams)
  const { items, result, near, channelNames } = await forPage(readSearchPage(await currentActor(), query))
  return (
    <div className="page">
      <PageHead title="Find" lead="Passages, questions and words of the trade, each at the minute it is about." />
      <SearchFields query={query} facets={result?.facets ?? null} channelNames={channelNames} />
      {dropped.length > 0 && (
        <Notice title={`Left out, because it is not one of the choices: ${dropped.join(', ')}.`} className="mb-5" />
      )}
      {!result && (
        <Notice title="Search is limited just now" className="mb-5">
          Words are found only as they are typed, and nothing is counted. All else on these pages works as ever.
        </Notice>
      )}
      {!asksSomething(query) && <SearchBegin />}
      {asksSomething(query) && items.length === 0 && <NothingFound query={query} near={near} />}
      {asksSomething(query) && items.length > 0 && <SearchResults query={query} items={items} result={result} />}
    </div>
  )
}
