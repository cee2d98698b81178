import Link from 'next/link'
import { Mark } from '@/components/ui/mark'

const links = [
  { href: '/', label: 'Farms' },
  { href: '/questions', label: 'Questions' },
  { href: '/handbook', label: 'Handbook' },
  { href: '/search', label: 'Search' },
]

/** The foot of every page: what this is, and what it does not replace. */
export function Footer() {
  return (
    <footer className="no-print mt-auto border-t border-rule">
      <div className="page flex flex-wrap items-start justify-between gap-x-12 gap-y-5 pt-7 pb-9">
        <div className="flex max-w-measure gap-4 text-sm text-ink-2">
          <Mark className="mt-1 shrink-0" />
          <p>
            Lessons from working farms, filed by crop and growth stage. Figures in the handbook say what they were held
            against, or that nobody has yet. Labels, manuals, local codes and licensed people come first.
          </p>
        </div>
        <nav aria-label="Foot of the page">
          <ul className="flex flex-wrap gap-x-6">
            {links.map(({ href, label }) => (
              <li key={href}>
                <Link href={href} className="flex min-h-11 items-center">
                  {label}
                </Link>
              </li>
            ))}
          </ul>
        </nav>
      </div>
    </footer>
  )
}
