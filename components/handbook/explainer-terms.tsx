import Link from 'next/link'

/** The words that an explainer stands behind. */
export function ExplainerTerms({ terms }: { terms: { slug: string; label: string; url: string }[] }) {
  if (terms.length === 0) return null
  return (
    <nav aria-label="Words explained here" className="no-print mt-7 max-w-measure border-t border-rule pt-3 text-sm">
      <p className="text-ink-3">Words explained here</p>
      <ul className="mt-1 flex flex-wrap gap-x-4">
        {terms.map(({ slug, label, url }) => (
          <li key={slug}>
            <Link href={url} className="inline-flex min-h-8 items-center">
              {label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  )
}
