'use client'

import { Film } from '@/components/player/film'
import { PlaybackProvider } from '@/components/player/playback-context'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import type { EpisodeView } from '@/lib/episodes/views'
import type { DeskQuestionView } from '@/lib/questions/views'
import { AnswerForm } from './answer-form'

type Props = { episode: EpisodeView; questions: DeskQuestionView[]; mayAnswer: boolean }

/** The questions booked for an episode, beside its film: each gets its seconds and a few written words. */
export function AnswersPanel({ episode, questions, mayAnswer }: Props) {
  const queue = `/desk/${episode.channel.slug}/questions`
  if (questions.length === 0)
    return (
      <EmptyState
        title="No question is booked for this episode"
        action={<ButtonLink href={queue}>To the queue</ButtonLink>}
      >
        Book questions for it from the queue. Each is then given the seconds that answer it here, and comes back to
        everybody asking when the episode is published.
      </EmptyState>
    )
  return (
    <PlaybackProvider at={0} duration={episode.duration ?? 0}>
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]">
        <div className="sheet lg:sticky lg:top-4">
          {episode.film ? (
            <Film title={episode.title} film={episode.film} captions={episode.captions} openAt={0} />
          ) : (
            <p className="p-5 text-ink-2">The film shows here once its first size is made. Times can be typed now.</p>
          )}
        </div>
        <ol className="sheet ruled">
          {questions.map((question) => (
            <AnswerForm key={question.id} question={question} episode={episode} mayAnswer={mayAnswer} />
          ))}
        </ol>
      </div>
    </PlaybackProvider>
  )
}
