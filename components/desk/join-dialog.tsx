'use client'

import { useDeferredValue, useState } from 'react'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Dialog } from '@/components/ui/dialog'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import { useAlike, useDeskMove } from '@/lib/questions/hooks'
import type { DeskQuestionView } from '@/lib/questions/views'

/** Finds the question that asks the same, in whatever words, and joins this one to it. */
export function JoinDialog({ question: { id, title, channel } }: { question: DeskQuestionView }) {
  const [open, setOpen] = useState(false)
  const hydrated = useHydrated()
  return (
    <Dialog
      open={open}
      onOpenChange={setOpen}
      title="Join to another question"
      description="Everybody asking this one is told when the other is answered. It can be taken out again."
      closeLabel="Leave it"
      trigger={
        <Button variant="line" disabled={!hydrated}>
          Join to…
        </Button>
      }
    >
      <JoinForm id={id} title={title} channel={channel.slug} onDone={() => setOpen(false)} />
    </Dialog>
  )
}

function JoinForm({ id, title, channel, onDone }: { id: string; title: string; channel: string; onDone: () => void }) {
  const [words, setWords] = useState(title)
  const [into, setInto] = useState<string | null>(null)
  const join = useDeskMove(id)
  const { data, isFetching } = useAlike(channel, useDeferredValue(words))
  const others = (data ?? []).filter((other) => other.kind === 'question' && other.id !== id)
  return (
    <div className="grid gap-4">
      {join.error && <Notice tone="failed" title={join.error.detail} />}
      <TextField label="Words of the other question" value={words} onChange={(event) => setWords(event.target.value)} />
      <fieldset aria-busy={isFetching}>
        <legend className="font-semibold">Which one?</legend>
        {others.length === 0 && <p className="text-ink-2">{isFetching ? 'Looking…' : 'Nothing sounds like that.'}</p>}
        {others.map((other) => (
          <Checkbox
            key={other.id}
            type="radio"
            name="into"
            label={`${other.title} (${other.asking} asking)`}
            checked={into === other.id}
            onChange={() => setInto(other.id ?? null)}
          />
        ))}
      </fieldset>
      <Button
        className="justify-self-start"
        disabled={into === null}
        busy={join.isPending && 'Joining'}
        onClick={() => join.mutate({ move: 'join', body: { into } }, { onSuccess: onDone })}
      >
        Join
      </Button>
    </div>
  )
}
