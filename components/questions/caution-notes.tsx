import { type Caution, whoComesFirst } from '@/lib/topics/cautions'

/** What stands at the head of whatever shows work that can hurt somebody. The sentences are always in sight. */
export function CautionNotes({ cautions }: { cautions: Caution[] }) {
  if (cautions.length === 0) return null
  return (
    <aside aria-label="Cautions" className="border-[1.5px] border-ink bg-sheet px-4 py-3">
      <ul className="grid gap-x-6 gap-y-2 text-sm md:grid-cols-2 lg:grid-cols-3">
        {cautions.map(({ key, title, text }) => (
          <li key={key}>
            <strong>{title}.</strong> {text}
          </li>
        ))}
      </ul>
      <p className="mt-2 border-t border-rule-2 pt-2 text-sm font-semibold">
        {whoComesFirst} When in doubt, ask a licensed person near you.
      </p>
      <details className="text-sm text-ink-3">
        <summary className="flex min-h-8 cursor-pointer items-center underline">Where these come from</summary>
        <ul>
          {cautions.map(({ key, title, citation, status }) => (
            <li key={key}>
              {title}: {citation}
              {status === 'M' && ' (from memory)'}
            </li>
          ))}
        </ul>
      </details>
    </aside>
  )
}
