'use client'

import { Button } from '@/components/ui/button'
import { useAsking } from '@/lib/questions/hooks'

/** "I'm asking too" beside a question in a list. */
export function AskingToo({ id }: { id: string }) {
  const change = useAsking(id)
  if (change.data?.youAreAsking)
    return <p className="text-sm font-semibold">You are asking this too. A letter comes when it is answered.</p>
  return (
    <>
      <Button variant="quiet" busy={change.isPending && 'Saving'} onClick={() => change.mutate(true)}>
        I’m asking too
      </Button>
      {change.error && <p className="text-sm font-semibold text-fault">{change.error.detail}</p>}
    </>
  )
}
