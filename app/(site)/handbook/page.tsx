import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { ExplainerRows } from '@/components/handbook/explainer-rows'
import { Glossary } from '@/components/handbook/glossary'
import { EmptyState } from '@/components/ui/empty-state'
import { everyTerm, listExplainers } from '@/lib/handbook/reads'
import { entriesQuery } from '@/lib/handbook/schema'

export const metadata: Metadata = {
  title: 'Handbook',
  description: 'The words of the trade explained, with figures that name the publication they were held against.',
}

export default async function HandbookPage() {
  const [terms, { items: explainers }] = await Promise.all([everyTerm(), listExplainers(entriesQuery.parse({}))])
  return (
    <div className="page pb-10">
      <PageHead
        title="Handbook"
        lead="The words of the trade, and what stands behind them. Every figure names its publication and says whether anybody has held it against that."
      />
      {explainers.length > 0 && (
        <section aria-labelledby="explainers" className="mb-9">
          <h2 id="explainers" className="mb-3">
            Explainers
          </h2>
          <ExplainerRows explainers={explainers} />
        </section>
      )}
      <section aria-labelledby="glossary">
        <h2 id="glossary" className="mb-3">
          Words from A to Z
        </h2>
        {terms.length > 0 ? (
          <Glossary terms={terms} />
        ) : (
          <EmptyState title="No words yet" level={3}>
            The glossary is loaded when this installation starts. Whoever runs it can load it again.
          </EmptyState>
        )}
      </section>
    </div>
  )
}
