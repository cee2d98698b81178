import { type Caution, whoComesFirst } from '@/lib/topics/cautions'

/**
 * What stands at the head of whatever shows work that can hurt somebody. Its sentences are always in sight; it is as
 * wide as its place, so that a film begins on the first screen.
 */
export function CautionNotes({ cautions }: { cautions: Caution[] }) {
  if (cautions.length === 0) return null
  return (
    <aside aria-label="Cautions" className="@container border-[1.5px] border-ink bg-sheet px-4 py-3 text-sm">
      <p className="font-semibold">{whoComesFirst} When in doubt, ask a licensed person near you.</p>
      <ul className="mt-1.5 grid gap-x-8 gap-y-1.5 @2xl:grid-cols-2 @5xl:grid-cols-3">
        {cautions.map(({ key, title, text }) => (
          <li key={key}>
            <strong>{title}.</strong> {text}
          </li>
        ))}
      </ul>
      <details className="mt-1 text-ink-3">
        <summary className="flex min-h-8 w-fit cursor-pointer items-center underline">Where this is written</summary>
        <ul>
          {cautions.map(({ key, title, citation, status }) => (
            <li key={key}>
              {title}: {citation}
              {status === 'M' && ' (from memory, to be opened)'}
            </li>
          ))}
        </ul>
      </details>
    </aside>
  )
}
