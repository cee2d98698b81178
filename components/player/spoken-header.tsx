'use client'

import { useHydrated } from '@/components/ui/use-hydrated'

const word = 'min-h-11 text-sm text-ink-2 underline decoration-dotted underline-offset-4 hover:decoration-solid'

/** The head of the text: its name, and what can be done with it. */
export function SpokenHeader({ finding, onFind }: { finding: boolean; onFind: () => void }) {
  const scripted = useHydrated()
  return (
    <header className="flex flex-wrap items-center justify-between gap-x-4 border-b border-rule px-3.5 max-lg:min-h-11 lg:min-h-14 lg:px-5.5">
      {/* On a narrow page the tab above says it. */}
      <h2 className="font-text text-base font-semibold tracking-normal max-lg:sr-only">As spoken</h2>
      {scripted && (
        <div className="flex gap-4 print:hidden">
          <button type="button" aria-expanded={finding} onClick={onFind} className={word}>
            Find in this episode
          </button>
          <button type="button" onClick={() => window.print()} className={word}>
            Print
          </button>
        </div>
      )}
    </header>
  )
}
