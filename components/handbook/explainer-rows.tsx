import Link from 'next/link'
import { checkWords } from '@/lib/handbook/rules'
import type { ExplainerLine } from '@/lib/handbook/views'

/** The explainers with how far each was checked. */
export function ExplainerRows({ explainers }: { explainers: ExplainerLine[] }) {
  return (
    <ul className="grid gap-px border border-rule bg-rule lg:grid-cols-2">
      {explainers.map((explainer) => (
        <li key={explainer.slug} className="bg-sheet px-4 py-4 md:px-5">
          <h3>
            <Link href={explainer.url} className="text-ink no-underline hover:underline">
              {explainer.title}
            </Link>
          </h3>
          <p className="mt-1 max-w-measure text-ink-2">{explainer.summary}</p>
          <p className="mt-1 text-sm text-act">{checkWords(explainer)}</p>
        </li>
      ))}
    </ul>
  )
}
