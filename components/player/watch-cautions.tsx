import { whoComesFirst, type Caution } from '@/lib/topics/cautions'

/** What can hurt somebody in the work that is shown: at the head of the episode, short enough to be read before it. */
export function WatchCautions({ cautions }: { cautions: Caution[] }) {
  if (cautions.length === 0) return null
  return (
    <aside aria-labelledby="cautions" className="border-[1.5px] border-ink bg-sheet px-4 py-3 text-sm">
      <h2 id="cautions" className="font-text text-sm font-semibold tracking-normal">
        Before you start. {whoComesFirst}
      </h2>
      <ul className="mt-1.5 grid gap-x-8 gap-y-1.5 lg:grid-cols-2">
        {cautions.map(({ key, title, text }) => (
          <li key={key}>
            <b className="font-semibold">{title}.</b> {text}
          </li>
        ))}
      </ul>
      <details className="mt-1.5 text-ink-3">
        <summary className="w-fit underline decoration-dotted underline-offset-4">Where this is written</summary>
        <ul className="mt-1">
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
