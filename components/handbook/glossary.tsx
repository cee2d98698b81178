import Link from 'next/link'
import { byLetter } from '@/lib/handbook/rules'
import type { TermLine } from '@/lib/handbook/views'

/** The terms from A to Z, with the letters to go to. */
export function Glossary({ terms }: { terms: TermLine[] }) {
  const letters = byLetter(terms)
  return (
    <>
      <nav aria-label="Letters" className="no-print mb-4">
        <ul className="flex flex-wrap gap-1">
          {letters.map(({ letter }) => (
            <li key={letter}>
              <a
                href={`#letter-${letter}`}
                className="flex size-9 items-center justify-center border border-rule bg-sheet font-semibold no-underline hover:bg-mist"
              >
                {letter}
              </a>
            </li>
          ))}
        </ul>
      </nav>
      {letters.map(({ letter, terms: under }) => (
        <section
          key={letter}
          aria-labelledby={`letter-${letter}`}
          className="mb-6 grid gap-x-6 md:grid-cols-[3rem_1fr]"
        >
          <h3 id={`letter-${letter}`} className="scroll-mt-4 pt-1 text-2xl">
            {letter}
          </h3>
          <dl className="sheet ruled">
            {under.map((term) => (
              <Entry key={term.slug} term={term} />
            ))}
          </dl>
        </section>
      ))}
    </>
  )
}

function Entry({ term: { label, url, definition, synonyms, regional } }: { term: TermLine }) {
  const also = [...synonyms, ...regional.map(({ place, name }) => `${name} (${place})`)]
  return (
    <div className="px-4 py-3 lg:grid lg:grid-cols-[14rem_1fr] lg:gap-x-5">
      <dt>
        <Link href={url} className="inline-flex min-h-6 items-center font-semibold">
          {label}
        </Link>
      </dt>
      <dd className="max-w-measure">
        {definition}
        {also.length > 0 && <span className="block text-sm text-ink-3">Also: {also.join(', ')}</span>}
      </dd>
    </div>
  )
}
