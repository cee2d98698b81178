'use client'

import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { usePeopleChange } from '@/lib/people/hooks'

/** Ends every sign-in but this one: for a lost phone, or a borrowed computer. */
export function OtherSignIns() {
  const end = usePeopleChange()
  return (
    <div className="sheet grid justify-items-start gap-3 p-5">
      <p className="max-w-measure text-ink-2">
        Lost a phone, or left a computer signed in? This ends every other sign-in at once.
      </p>
      {end.isSuccess && <Notice tone="done" title="Every other sign-in has ended." />}
      {end.error && <Notice tone="failed" title={end.error.detail} />}
      <Button
        variant="line"
        onClick={() => end.mutate({ path: '/api/me/sessions', method: 'DELETE' })}
        busy={end.isPending && 'Ending them'}
      >
        End my other sign-ins
      </Button>
    </div>
  )
}
