import { whoComesFirst } from '@/lib/topics/cautions'

/** What can hurt somebody, said before anything else. */
export function CautionHead({ caution }: { caution: string }) {
  return (
    <aside aria-label="Caution" className="mb-6 max-w-measure border-[1.5px] border-ink bg-sheet px-4 py-3.5">
      <p className="font-display text-lg font-semibold">Before you start</p>
      <p className="mt-1">{caution}</p>
      <p className="mt-1 text-sm text-ink-2">{whoComesFirst}</p>
    </aside>
  )
}
