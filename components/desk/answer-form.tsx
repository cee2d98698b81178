'use client'

import Link from 'next/link'
import { useId, useState } from 'react'
import { usePlayback } from '@/components/player/playback-context'
import { Button } from '@/components/ui/button'
import { TextArea } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import type { EpisodeView } from '@/lib/episodes/views'
import { useAnswer } from '@/lib/questions/hooks'
import { ANSWER_MOST } from '@/lib/questions/limits'
import type { DeskQuestionView } from '@/lib/questions/views'
import { writeTime } from '@/lib/times/parse'
import { type AnswerDraft, draftFaults, draftOf, inputOf } from './answer-draft'
import { SecondField } from './second-field'
import { useUnsaved } from './use-unsaved'

type Props = { question: DeskQuestionView; episode: EpisodeView; mayAnswer: boolean }

/** Where it stands for those who ask. */
function standing({ state, answer }: DeskQuestionView, { state: shown }: EpisodeView): string {
  if (state === 'answered') return 'Answered. Everybody asking has a letter with this second.'
  if (!answer) return 'No answer yet. Published like this, the question goes back to the queue.'
  return shown === 'published' ? 'Answered.' : 'Ready. It comes back to everybody asking when the episode is published.'
}

/** One question's range and words. Seconds are typed or taken from the film. */
export function AnswerForm({ question, episode, mayAnswer }: Props) {
  const heading = useId()
  const hydrated = useHydrated()
  const playback = usePlayback()
  const [draft, setDraft] = useState(() => draftOf(question, episode.id))
  const [touched, setTouched] = useState(false)
  const [pressed, setPressed] = useState(false)
  const save = useAnswer(question.id)
  useUnsaved(touched)
  const faults = pressed ? draftFaults(draft, episode.duration) : {}
  const change = (part: Partial<AnswerDraft>) => {
    setDraft({ ...draft, ...part })
    setTouched(true)
    save.reset()
  }
  const here = () => writeTime(playback.read().at)
  const submit = () => {
    setPressed(true)
    const input = inputOf(draft, episode.id, episode.duration)
    if (input) save.mutate(input, { onSuccess: () => setTouched(false) })
  }
  return (
    <li className="p-5">
      <form
        aria-labelledby={heading}
        className="grid gap-4"
        onSubmit={(event) => {
          event.preventDefault()
          submit()
        }}
      >
        <div>
          <h3 id={heading}>
            <Link href={question.url} className="text-ink no-underline hover:underline">
              {question.title}
            </Link>
          </h3>
          <p className="mt-1 text-sm text-ink-3">
            {question.asking} asking · {standing(question, episode)}
          </p>
        </div>
        <div className="grid gap-4 sm:grid-cols-2">
          <SecondField
            label="Answer starts"
            value={draft.start}
            error={faults.start}
            onChange={(start) => change({ start })}
            here={here}
          />
          <SecondField
            label="Answer ends"
            value={draft.end}
            error={faults.end}
            onChange={(end) => change({ end })}
            here={here}
          />
        </div>
        <TextArea
          label="The answer in a few words"
          hint="Stands on the question’s page and in the letter."
          rows={3}
          maxLength={ANSWER_MOST}
          value={draft.text}
          error={faults.text}
          onChange={(event) => change({ text: event.target.value })}
        />
        {save.error && <Notice tone={save.error.status === 0 ? 'offline' : 'failed'} title={save.error.detail} />}
        {save.isSuccess && !touched && <Notice tone="done" title="Saved." />}
        <Button
          type="submit"
          className="justify-self-start"
          disabled={!hydrated || !mayAnswer}
          busy={save.isPending && 'Saving'}
        >
          Save the answer
        </Button>
      </form>
    </li>
  )
}
