import { type Caution, whoComesFirst } from '@/lib/topics/cautions'

/** What stands at the head of a question whose work can hurt somebody. */
export function CautionNotes({ cautions }: { cautions: Caution[] }) {
  if (cautions.length === 0) return null
  return (
    <aside aria-label="Cautions" className="border-[1.5px] border-ink bg-sheet px-4 py-3">
      <ul className="ruled">
        {cautions.map(({ key, title, text, citation, status }) => (
          <li key={key} className="py-2 first:pt-0">
            <p className="font-semibold">{title}</p>
            <p className="max-w-measure">{text}</p>
            <p className="text-sm text-ink-3">
              {citation}
              {status === 'M' && ' (from memory)'}
            </p>
          </li>
        ))}
      </ul>
      <p className="border-t border-rule-2 pt-2 text-sm font-semibold">
        {whoComesFirst} When in doubt, ask a licensed person near you.
      </p>
    </aside>
  )
}
