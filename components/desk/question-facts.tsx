import type { ReactNode } from 'react'

/** Short facts in two columns. */
export function QuestionFacts({ facts }: { facts: [string, ReactNode][] }) {
  return (
    <dl className="grid grid-cols-[7rem_minmax(0,1fr)] gap-x-4 gap-y-2">
      {facts.map(([name, value]) => (
        <div key={name} className="contents">
          <dt className="text-ink-3">{name}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  )
}
