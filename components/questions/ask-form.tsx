'use client'

import { useActionState, useEffect, useRef, useState, type FormEvent } from 'react'
import { Button } from '@/components/ui/button'
import { TextArea, TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import { useHydrated } from '@/components/ui/use-hydrated'
import { type AskFormState, sendQuestion } from '@/lib/questions/actions'
import type { AskFields } from '@/lib/questions/form-rules'
import { BODY_MOST, TITLE_MOST } from '@/lib/questions/limits'
import { AboutChoice } from './about-choice'
import { AlikeList } from './alike-list'
import { keepDraft, restoreDraft } from './ask-draft'
import { AskProblem } from './ask-problem'
import { PhotoPicker } from './photo-picker'
import { useSending } from './use-sending'

type Props = {
  channels: { slug: string; name: string }[]
  /** Filled in from the address and the chapter. */
  fields: AskFields
  signedIn: boolean
  /** The address of this form, to come back to after signing in. */
  here: string
  /** Shown in place of the choice of a farm when the question is about an episode. */
  fixedChannel: boolean
}

/**
 * Asks a question. Works before and without JavaScript through a server action; with it the text outlives a lost line,
 * a reload and signing in.
 */
export function AskForm({ channels, fields: first, signedIn, here, fixedChannel }: Props) {
  const start: AskFormState = { fields: first, problem: null }
  const [state, action] = useActionState(sendQuestion, start)
  const [typed, setTyped] = useState({ channel: first.channel, text: first.title })
  const form = useRef<HTMLFormElement>(null)
  const sending = useSending({ signedIn, here })
  const hydrated = useHydrated()
  const { fields } = state
  const [restored, setRestored] = useState(false)
  useEffect(() => {
    if (form.current && restoreDraft(form.current)) setRestored(true)
  }, [])
  const follow = (event: FormEvent<HTMLFormElement>) => {
    keepDraft(event.currentTarget)
    const now = new FormData(event.currentTarget)
    setTyped({ channel: String(now.get('channel')), text: String(now.get('title')) })
  }
  return (
    <div className="grid gap-8 lg:grid-cols-[minmax(0,1fr)_20rem]">
      <form ref={form} action={action} onSubmit={sending.submit} onInput={follow} className="sheet grid gap-5 p-5">
        {restored && (
          <Notice title="Your question is here as you wrote it.">
            It is not sent yet. {signedIn ? 'Read it once more and press “Send the question”.' : 'Sign in to send it.'}{' '}
            Photos have to be chosen again.
          </Notice>
        )}
        <AskProblem here={here} state={state} failure={sending.failure} />
        <input type="hidden" name="episodeId" value={fields.episodeId} />
        <input type="hidden" name="at" value={fields.at} />
        {fixedChannel ? (
          <input type="hidden" name="channel" value={fields.channel} />
        ) : (
          <Select
            label="Whom do you ask?"
            name="channel"
            required
            defaultValue={fields.channel}
            empty="Choose a farm"
            options={channels.map(({ slug, name }) => ({ value: slug, label: name }))}
          />
        )}
        <TextField
          label="Your question in one line"
          name="title"
          required
          maxLength={TITLE_MOST}
          defaultValue={fields.title}
          autoComplete="off"
        />
        <TextArea
          label="What should the farm know to answer it?"
          hint="Soil, weather, what you have done so far. You can leave it empty."
          name="body"
          rows={6}
          maxLength={BODY_MOST}
          defaultValue={fields.body}
        />
        <AboutChoice defaultValue={fields.about} filledIn={first.about} />
        {hydrated && <PhotoPicker />}
        <div className="flex flex-wrap items-center gap-4">
          <Button type="submit" busy={sending.isPending && 'Sending'}>
            {signedIn ? 'Send the question' : 'Sign in to send it'}
          </Button>
          <p className="text-sm text-ink-3">Your name stands with it; your address is never shown.</p>
        </div>
      </form>
      {typed.channel && <AlikeList channel={typed.channel} text={typed.text} signedIn={signedIn} />}
    </div>
  )
}
