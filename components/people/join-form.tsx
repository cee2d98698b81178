'use client'

import { useActionState } from 'react'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { join, type JoinState } from '@/lib/people/actions'

const nothingYet: JoinState = { refused: null }

export function JoinForm({ token }: { token: string }) {
  const [state, accept, busy] = useActionState(() => join(token), nothingYet)
  return (
    <form action={accept} className="grid justify-items-start gap-4">
      {state.refused && <Notice tone="failed" title={state.refused} />}
      <Button type="submit" busy={busy && 'Opening the desk'}>
        Accept
      </Button>
    </form>
  )
}
