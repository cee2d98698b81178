'use client'

import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { usePeopleChange } from '@/lib/people/hooks'
import type { SitePersonView } from '@/lib/site/views'

const belongs = ({ channels, isAdmin }: SitePersonView) =>
  [isAdmin && 'site admin', ...channels.map(({ name, role }) => `${role} of ${name}`)].filter(Boolean).join(', ') ||
  'viewer'

/** Everybody with a way to sign in. */
export function PersonList({ people }: { people: SitePersonView[] }) {
  const change = usePeopleChange()
  return (
    <div className="grid gap-3">
      {change.error && <Notice tone="failed" title={change.error.detail} />}
      <ul className="sheet ruled">
        {people.map((person) => (
          <li key={person.id} className="flex flex-wrap items-center justify-between gap-3 px-5 py-3">
            <p className="min-w-0">
              <strong>{person.name}</strong> <span className="text-sm break-all text-ink-3">{person.email}</span>
              <br />
              <span className="text-sm text-ink-2">
                {belongs(person)}
                {person.disabled && ' · disabled'}
              </span>
            </p>
            <Button
              variant="line"
              onClick={() =>
                change.mutate({
                  path: `/api/admin/people/${person.id}`,
                  method: 'PATCH',
                  body: { disabled: !person.disabled },
                })
              }
            >
              {person.disabled ? 'Let in again' : 'Disable'}
              <span className="sr-only"> {person.name}</span>
            </Button>
          </li>
        ))}
      </ul>
    </div>
  )
}
