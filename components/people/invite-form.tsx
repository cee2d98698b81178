'use client'

import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import { useHydrated } from '@/components/ui/use-hydrated'
import { usePeopleChange } from '@/lib/people/hooks'
import { roleOptions } from './role-words'

/** Asks somebody to the desk by letter. */
export function InviteForm({ channel }: { channel: string }) {
  const ask = usePeopleChange()
  const hydrated = useHydrated()
  return (
    <form
      className="sheet grid gap-4 p-5 md:grid-cols-[minmax(0,2fr)_minmax(0,2fr)_auto] md:items-end"
      onSubmit={(event) => {
        event.preventDefault()
        const form = new FormData(event.currentTarget)
        const body = { email: form.get('email'), role: form.get('role') }
        ask.mutate({ path: `/api/channels/${channel}/people`, method: 'POST', body })
      }}
    >
      <TextField label="E-mail address" name="email" type="email" required maxLength={254} />
      <Select label="As" name="role" options={roleOptions} defaultValue="editor" />
      <Button type="submit" disabled={!hydrated} busy={ask.isPending && 'Asking'}>
        Ask them in
      </Button>
      {ask.error && <Notice tone="failed" title={ask.error.detail} className="md:col-span-3" />}
      {ask.isSuccess && <Notice tone="done" title="A letter is on its way." className="md:col-span-3" />}
    </form>
  )
}
