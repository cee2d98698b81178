'use client'

import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import { usePeopleChange } from '@/lib/people/hooks'
import type { MemberView } from '@/lib/people/views'
import { roleOptions } from './role-words'

/** Who works at a desk, and as what. */
export function MemberList({ channel, members }: { channel: string; members: MemberView[] }) {
  const change = usePeopleChange()
  const path = (id: string) => `/api/channels/${channel}/people/${id}`
  return (
    <div className="grid gap-3">
      {change.error && <Notice tone="failed" title={change.error.detail} />}
      <ul className="sheet ruled">
        {members.map(({ id, name, email, role }) => (
          <li key={id} className="grid gap-3 px-5 py-4 md:grid-cols-[minmax(0,1fr)_20rem_auto] md:items-end">
            <p>
              <strong>{name}</strong>
              <br />
              <span className="text-sm break-all text-ink-3">{email}</span>
            </p>
            <Select
              // Drawn again with what the server says, also after a refusal.
              key={`${role} ${change.failureCount}`}
              label="Works as"
              options={roleOptions}
              defaultValue={role}
              onChange={(event) =>
                change.mutate({ path: path(id), method: 'PATCH', body: { role: event.target.value } })
              }
            />
            <Button variant="line" onClick={() => change.mutate({ path: path(id), method: 'DELETE' })}>
              Take off<span className="sr-only"> {name}</span>
            </Button>
          </li>
        ))}
      </ul>
    </div>
  )
}
