import Link from 'next/link'
import { EmptyState } from '@/components/ui/empty-state'

const beginnings = [
  { href: '/search?stage=wheat-2', words: 'wheat while it tillers' },
  { href: '/search?job=job-drilling', words: 'drilling' },
  { href: '/search?subject=subject-water', words: 'water' },
  { href: '/search?kind=question', words: 'what others have asked' },
]

/** Before anything was asked for: what is here, and how to begin. */
export function SearchBegin() {
  return (
    <EmptyState title="Find the minute you need">
      <p>
        Type what you would say in the field: a job, a trouble, a word of the trade. Everything that is said on camera
        is searched, and a result opens at the second it is said. Or pick a crop and a stage and see what there is.
      </p>
      <p className="mt-3">
        To begin:{' '}
        {beginnings.map(({ href, words }, at) => (
          <span key={href}>
            {at > 0 && ', '}
            <Link href={href}>{words}</Link>
          </span>
        ))}
        .
      </p>
    </EmptyState>
  )
}
