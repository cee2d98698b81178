'use client'

import { useState } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import { type Standing, useAsking } from '@/lib/questions/hooks'

type Props = {
  question: { id: string; title: string; url: string; state: string } & Standing
  signedIn: boolean
}

const asked = (count: number) => (count === 1 ? '1 person asked this.' : `${count} people asked this.`)

/** How many want the answer, and whether this person is among them. */
export function AskingButton({ question, signedIn }: Props) {
  const [standing, setStanding] = useState<Standing>(question)
  const hydrated = useHydrated()
  const change = useAsking(question.id)
  const { asking, youAreAsking } = standing
  if (question.state === 'answered') return <p>{asked(asking)}</p>
  const words = asking === 1 ? '1 person is asking this' : `${asking} people are asking this`
  return (
    <div className="grid gap-3">
      <p aria-live="polite">
        {youAreAsking ? `${words}, you among them. A letter comes when it is answered.` : `${words}.`}
      </p>
      {change.error && <Notice tone={change.error.status === 0 ? 'offline' : 'failed'} title={change.error.detail} />}
      {signedIn ? (
        <Button
          variant="line"
          className="justify-self-start"
          disabled={!hydrated}
          busy={change.isPending && 'Saving'}
          onClick={() => change.mutate(!youAreAsking, { onSuccess: setStanding })}
        >
          {youAreAsking ? 'I’m not asking any more' : 'I’m asking too'}
        </Button>
      ) : (
        <ButtonLink
          variant="line"
          className="justify-self-start"
          href={`/sign-in?callbackUrl=${encodeURIComponent(question.url)}`}
        >
          Sign in to ask too
        </ButtonLink>
      )}
    </div>
  )
}
