'use client'

import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import { usePeopleChange } from '@/lib/people/hooks'

/** Opens a channel; its owner is asked in by letter. */
export function ChannelForm() {
  const open = usePeopleChange<{ name: string }>()
  const hydrated = useHydrated()
  return (
    <form
      className="sheet grid gap-4 p-5 md:grid-cols-3 md:items-end"
      onSubmit={(event) => {
        event.preventDefault()
        const form = new FormData(event.currentTarget)
        open.mutate({ path: '/api/channels', method: 'POST', body: Object.fromEntries(form) })
      }}
    >
      <TextField label="Name of the farm" name="name" required maxLength={80} autoComplete="off" />
      <TextField label="Owner’s e-mail address" name="owner" type="email" required maxLength={254} autoComplete="off" />
      <TextField label="Time zone" name="timeZone" required defaultValue="America/Chicago" autoComplete="off" />
      <Button type="submit" className="justify-self-start" disabled={!hydrated} busy={open.isPending && 'Opening'}>
        Open a channel
      </Button>
      {open.error && <Notice tone="failed" title={open.error.detail} className="md:col-span-3" />}
      {open.data && (
        <Notice tone="done" title={`${open.data.name} is open. Its owner has a letter.`} className="md:col-span-3" />
      )}
    </form>
  )
}
