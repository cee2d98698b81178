'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { TextArea } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import { useVerdict } from '@/lib/questions/hooks'

/** For those who ask: does the answer settle it? "Not yet" says why and opens the question again. */
export function VerdictForm({ id }: { id: string }) {
  const [saysNotYet, setSaysNotYet] = useState(false)
  const [note, setNote] = useState('')
  const hydrated = useHydrated()
  const verdict = useVerdict(id)
  if (verdict.data?.state === 'answered')
    return <Notice tone="done" title="Thank you. The farm sees that it is settled for you." />
  return (
    <form
      className="grid gap-3"
      onSubmit={(event) => {
        event.preventDefault()
        verdict.mutate({ settled: false, note })
      }}
    >
      <p className="font-semibold">Does that answer it?</p>
      {verdict.error && <Notice tone="failed" title={verdict.error.detail} />}
      {saysNotYet && (
        <TextArea
          label="What is still missing?"
          hint="The question goes back to the queue with your words."
          value={note}
          maxLength={1000}
          rows={3}
          autoFocus
          onChange={(event) => setNote(event.target.value)}
        />
      )}
      <div className="flex flex-wrap gap-2.5">
        {saysNotYet ? (
          <Button type="submit" busy={verdict.isPending && 'Sending'}>
            Open it again
          </Button>
        ) : (
          <Button
            disabled={!hydrated}
            busy={verdict.isPending && 'Saving'}
            onClick={() => verdict.mutate({ settled: true })}
          >
            That answers it
          </Button>
        )}
        <Button variant="line" disabled={!hydrated} onClick={() => setSaysNotYet(!saysNotYet)}>
          {saysNotYet ? 'Back' : 'Not yet, because'}
        </Button>
      </div>
    </form>
  )
}
