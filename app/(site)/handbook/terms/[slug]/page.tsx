import type { Metadata } from 'next'
import Link from 'next/link'
import { PageHead } from '@/components/frame/page-head'
import { HeardList } from '@/components/handbook/heard-list'
import { TermFacts } from '@/components/handbook/term-facts'
import { EmptyState } from '@/components/ui/empty-state'
import { JsonLd } from '@/components/ui/json-ld'
import { currentActor } from '@/lib/auth/current'
import { env } from '@/lib/env'
import { readTerm } from '@/lib/handbook/reads'
import { definedTerm } from '@/lib/handbook/structured-data'
import { forPage } from '@/lib/http/page'

type Props = PageProps<'/handbook/terms/[slug]'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { label, definition } = await forPage(readTerm(await currentActor(), (await params).slug))
  return { title: `${label}: what it means`, description: definition }
}

export default async function TermPage({ params }: Props) {
  const term = await forPage(readTerm(await currentActor(), (await params).slug))
  return (
    <div className="page pb-10">
      <JsonLd data={definedTerm(term, env().BASE_URL)} />
      <PageHead
        eyebrow={<Link href="/handbook">Handbook</Link>}
        title={<span className="inline-block first-letter:uppercase">{term.label}</span>}
        lead={<p className="text-lg text-ink">{term.definition}</p>}
      />
      <div className="grid items-start gap-x-8 gap-y-7 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <section aria-labelledby="heard" className="order-2 lg:order-1">
          <h2 id="heard" className="mb-3">
            Where it is said
          </h2>
          {term.heard.length > 0 ? (
            <HeardList heard={term.heard} />
          ) : (
            <EmptyState title="Not said on camera yet" level={3}>
              The sentences in which this word is spoken will stand here, each opening at its second.
            </EmptyState>
          )}
        </section>
        <div className="order-1 lg:order-2">
          <TermFacts term={term} />
        </div>
      </div>
    </div>
  )
}
