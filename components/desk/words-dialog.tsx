'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { TextArea } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import { useDeskMove } from '@/lib/questions/hooks'
import type { QuestionMove } from '@/lib/questions/rules'

type Props = {
  id: string
  move: QuestionMove
  /** What the words are called in the API. */
  field: string
  trigger: string
  label: string
  send: string
  required?: boolean
}

/** A move that takes a few words: the question waits behind it, and closing it loses nothing but the words. */
export function WordsDialog({ id, move: name, field, trigger, label, send, required }: Props) {
  const [open, setOpen] = useState(false)
  const hydrated = useHydrated()
  const move = useDeskMove(id)
  return (
    <Dialog
      open={open}
      onOpenChange={setOpen}
      title={trigger}
      closeLabel="Leave it"
      trigger={
        <Button variant="line" disabled={!hydrated}>
          {trigger}
        </Button>
      }
    >
      <form
        className="grid gap-4"
        onSubmit={(event) => {
          event.preventDefault()
          const words = String(new FormData(event.currentTarget).get('words'))
          move.mutate({ move: name, body: { [field]: words } }, { onSuccess: () => setOpen(false) })
        }}
      >
        {move.error && <Notice tone="failed" title={move.error.detail} />}
        <TextArea label={label} name="words" rows={4} maxLength={500} required={required} />
        <Button type="submit" className="justify-self-start" busy={move.isPending && 'Sending'}>
          {send}
        </Button>
      </form>
    </Dialog>
  )
}
