/** What this installation leans on, each with its state in words. */
export function HealthList({ parts }: { parts: [string, 'ok' | 'failing'][] }) {
  return (
    <ul className="sheet grid divide-rule max-md:divide-y md:grid-cols-5 md:divide-x">
      {parts.map(([name, state]) => (
        <li key={name} className="px-5 py-3">
          <strong className="capitalize">{name}</strong>
          <br />
          <span className={state === 'ok' ? 'text-ink-2' : 'font-semibold text-fault'}>
            {state === 'ok' ? 'answers' : 'does not answer'}
          </span>
        </li>
      ))}
    </ul>
  )
}
