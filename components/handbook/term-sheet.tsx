import Link from 'next/link'
import { checkWords } from '@/lib/handbook/rules'
import type { TermNote } from '@/lib/handbook/views'

/** The small ruled sheet of a term: what it means, how far that was checked, where to read on. `headingId` names it. */
export function TermSheet({ note, headingId }: { note: TermNote; headingId?: string }) {
  const { explainer } = note
  return (
    <div className="border border-ink bg-sheet px-4 py-3 text-ink">
      <p id={headingId} className="font-display text-lg leading-tight font-semibold first-letter:uppercase">
        {note.label}
      </p>
      <p className="mt-1.5 text-sm">{note.definition}</p>
      <p className="mt-2 text-sm">
        {explainer && (
          <>
            <strong className="font-semibold text-act">{checkWords(explainer)}</strong>
            {' · '}
            <Link href={`/handbook/explainers/${explainer.slug}`}>Read the explainer</Link>
            {' · '}
          </>
        )}
        <Link href={`/handbook/terms/${note.slug}`}>Where it is said</Link>
      </p>
    </div>
  )
}
