'use client'

import { useState } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import { useHydrated } from '@/components/ui/use-hydrated'
import { type DeskMove, useDeskMove } from '@/lib/questions/hooks'
import type { QuestionState } from '@/lib/questions/rules'
import type { ComingEpisode, DeskQuestionView } from '@/lib/questions/views'
import { JoinDialog } from './join-dialog'
import { WordsDialog } from './words-dialog'

const queueWords: Partial<Record<QuestionState, string>> = {
  new: 'Put in the queue',
  booked: 'Back to the queue',
  'set-aside': 'Put in the queue after all',
  joined: 'Take out of the joining',
}

type Props = { question: DeskQuestionView; coming: ComingEpisode[]; mayBook: boolean }

/** The moves that the question's state allows. */
export function QuestionMoves({ question, coming, mayBook }: Props) {
  const { id, state, moves, channel, bookedFor } = question
  const move = useDeskMove(id)
  const hydrated = useHydrated()
  const allowed = (name: DeskMove['move']) => moves.includes(name)
  return (
    <div className="grid gap-3">
      {move.error && <Notice tone="failed" title={move.error.detail} />}
      {allowed('book') && mayBook && (
        <Booking coming={coming} channel={channel.slug} onBook={(body) => move.mutate({ move: 'book', body })} />
      )}
      {state === 'booked' && bookedFor && mayBook && (
        <ButtonLink href={`/desk/${channel.slug}/episodes/${bookedFor.id}/answers`} className="justify-self-start">
          Give its answer on episode {bookedFor.number}
        </ButtonLink>
      )}
      <div className="flex flex-wrap gap-2.5">
        {allowed('queue') && (
          <Button
            variant="line"
            disabled={!hydrated}
            busy={move.isPending && 'Saving'}
            onClick={() => move.mutate({ move: 'queue' })}
          >
            {queueWords[state]}
          </Button>
        )}
        {allowed('ask-detail') && (
          <WordsDialog
            id={id}
            move="ask-detail"
            field="message"
            trigger="Ask for detail"
            label="What do you need to know?"
            send="Write to the asker"
            required
          />
        )}
        {allowed('to-adviser') && (
          <WordsDialog
            id={id}
            move="to-adviser"
            field="note"
            trigger="To the adviser"
            label="What should the adviser look at?"
            send="Send to the adviser"
          />
        )}
        {allowed('join') && <JoinDialog question={question} />}
        {allowed('set-aside') && (
          <WordsDialog
            id={id}
            move="set-aside"
            field="reason"
            trigger="Set aside"
            label="Why? The asker can read it."
            send="Set aside"
            required
          />
        )}
      </div>
    </div>
  )
}

type BookingProps = { coming: ComingEpisode[]; channel: string; onBook: (body: { episodeId: string }) => void }

function Booking({ coming, channel, onBook }: BookingProps) {
  const hydrated = useHydrated()
  const [episodeId, setEpisodeId] = useState(coming[0]?.id ?? '')
  const chosen = coming.find(({ id }) => id === episodeId)
  if (!chosen)
    return (
      <p>
        No coming episode to book it for.{' '}
        <ButtonLink variant="quiet" href={`/desk/${channel}/episodes`}>
          Begin one
        </ButtonLink>
      </p>
    )
  return (
    <div className="flex flex-wrap items-end gap-2.5">
      <Select
        label="Answer it in"
        className="min-w-48 flex-1"
        value={episodeId}
        onChange={(event) => setEpisodeId(event.target.value)}
        options={coming.map(({ id, number, title }) => ({ value: id, label: `${number}. ${title}` }))}
      />
      <Button disabled={!hydrated} onClick={() => onBook({ episodeId })}>
        Book for episode {chosen.number}
      </Button>
    </div>
  )
}
