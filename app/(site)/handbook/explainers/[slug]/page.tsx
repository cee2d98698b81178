import type { Metadata } from 'next'
import Link from 'next/link'
import { PageHead } from '@/components/frame/page-head'
import { CautionHead } from '@/components/handbook/caution-head'
import { ClaimTable } from '@/components/handbook/claim-table'
import { ExplainerTerms } from '@/components/handbook/explainer-terms'
import { ExplainerText } from '@/components/handbook/explainer-text'
import { SourceList } from '@/components/handbook/source-words'
import { fullDay } from '@/lib/dates/rules'
import { readExplainer } from '@/lib/handbook/reads'
import { checkWords } from '@/lib/handbook/rules'
import { forPage } from '@/lib/http/page'

type Props = PageProps<'/handbook/explainers/[slug]'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { title, summary } = await forPage(readExplainer((await params).slug))
  return { title, description: summary }
}

export default async function ExplainerPage({ params }: Props) {
  const explainer = await forPage(readExplainer((await params).slug))
  const { title, summary, caution, body, claims, bibliography, terms, checkedOn, state } = explainer
  const checked = state === 'checked' && checkedOn ? ` on ${fullDay(checkedOn)}` : ''
  return (
    <div className="page pb-10">
      <PageHead
        eyebrow={<Link href="/handbook">Handbook</Link>}
        title={title}
        lead={
          <>
            <p>{summary}</p>
            <p className="mt-1.5 text-sm font-semibold text-act">{checkWords(explainer) + checked}</p>
          </>
        }
      />
      <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,42rem)_minmax(0,1fr)]">
        <article>
          {caution && <CautionHead caution={caution} />}
          <ExplainerText body={body} claims={claims} />
          <ExplainerTerms terms={terms} />
        </article>
        <section
          aria-labelledby="claims"
          className="border-t border-ink lg:border-t-0 lg:border-l lg:border-rule lg:pl-4"
        >
          <h2 id="claims" className="px-3 pt-4 pb-2 lg:pt-0">
            The figures, and where they are from
          </h2>
          <ClaimTable claims={claims} />
        </section>
      </div>
      <section aria-labelledby="sources" className="mt-9 max-w-measure border-t border-ink pt-4">
        <h2 id="sources" className="mb-1">
          Publications
        </h2>
        <SourceList sources={bibliography} />
      </section>
    </div>
  )
}
