import Link from 'next/link'
import { checkWords } from '@/lib/handbook/rules'
import { explainerUrl, type TermView } from '@/lib/handbook/views'

/** What a term is also called, and where to read on. */
export function TermFacts({ term }: { term: TermView }) {
  const { synonyms, regional, spanish, field, explainer, sourceNote } = term
  const facts: [string, string][] = [
    ['Field of work', field],
    ['Also called', synonyms.join(', ')],
    ['Elsewhere', regional.map(({ place, name }) => `${name} (${place})`).join(', ')],
    ['In Spanish', spanish ?? ''],
  ]
  return (
    <div className="sheet px-4 py-4 md:px-5">
      <dl className="space-y-2">
        {facts.map(
          ([name, value]) =>
            value && (
              <div key={name} className="gap-x-5 sm:grid sm:grid-cols-[8rem_1fr] sm:items-baseline">
                <dt className="text-sm text-ink-3">{name}</dt>
                <dd lang={name === 'In Spanish' ? 'es' : undefined}>{value}</dd>
              </div>
            ),
        )}
      </dl>
      {explainer && (
        <p className="mt-3 border-t border-rule pt-3">
          <Link href={explainerUrl(explainer.slug)}>{explainer.title}</Link>
          <span className="block text-sm text-act">{checkWords(explainer)}</span>
        </p>
      )}
      {sourceNote && <p className="mt-3 border-t border-rule pt-3 text-sm text-ink-3">This definition: {sourceNote}</p>}
    </div>
  )
}
