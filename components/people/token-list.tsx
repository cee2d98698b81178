'use client'

import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import { usePeopleChange } from '@/lib/people/hooks'
import type { TokenView } from '@/lib/people/views'

const day = (iso: string) => iso.slice(0, 10)

/** Tokens for a person's own scripts: made once, told once, ended at any time. */
export function TokenList({ tokens }: { tokens: TokenView[] }) {
  const make = usePeopleChange<{ token: string }>()
  const end = usePeopleChange()
  const hydrated = useHydrated()
  return (
    <div className="sheet grid gap-4 p-5">
      {tokens.length === 0 && <p className="text-ink-2">None yet. A script sends one as “Authorization: Bearer …”.</p>}
      {tokens.length > 0 && (
        <ul className="ruled">
          {tokens.map(({ id, name, made, lastUsed }) => (
            <li key={id} className="flex flex-wrap items-center justify-between gap-3 py-2">
              <span>
                {name}{' '}
                <span className="text-sm text-ink-3">
                  made {day(made)}, {lastUsed ? `last used ${day(lastUsed)}` : 'never used'}
                </span>
              </span>
              <Button variant="quiet" onClick={() => end.mutate({ path: `/api/me/tokens/${id}`, method: 'DELETE' })}>
                End<span className="sr-only"> {name}</span>
              </Button>
            </li>
          ))}
        </ul>
      )}
      {make.data && (
        <Notice tone="done" title="Copy it now. It is not shown again.">
          <code className="font-mono break-all">{make.data.token}</code>
        </Notice>
      )}
      {(make.error ?? end.error) && <Notice tone="failed" title={(make.error ?? end.error)?.detail} />}
      <form
        className="flex flex-wrap items-end gap-3"
        onSubmit={(event) => {
          event.preventDefault()
          const name = new FormData(event.currentTarget).get('name')
          make.mutate({ path: '/api/me/tokens', method: 'POST', body: { name } })
          event.currentTarget.reset()
        }}
      >
        <TextField label="What it is for" name="name" required maxLength={60} autoComplete="off" />
        <Button type="submit" variant="line" disabled={!hydrated} busy={make.isPending && 'Making it'}>
          Make a token
        </Button>
      </form>
    </div>
  )
}
