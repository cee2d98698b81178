import Link from 'next/link'
import { AskedStage } from '@/components/questions/asked-stage'
import { Cell, HeadCell, Row, Table } from '@/components/ui/table'
import { TimeCode } from '@/components/ui/time-code'
import { isOpen, stateWord } from '@/lib/questions/rules'
import { usefulWords } from '@/lib/questions/urgency-rules'
import type { DeskQuestionView } from '@/lib/questions/views'

/** Where it was asked, and what else there is to know before opening it. */
function Beneath({ question: { episode, at, photos, state, bookedFor } }: { question: DeskQuestionView }) {
  return (
    <p className="mt-0.5 text-sm text-ink-3">
      {episode ? (
        <>
          Episode {episode.number}
          {at !== null && (
            <>
              {' at '}
              <TimeCode seconds={at} />
            </>
          )}
        </>
      ) : (
        'From the questions page'
      )}
      {photos.length > 0 && ` · ${photos.length} ${photos.length === 1 ? 'photo' : 'photos'}`}
      {state !== 'queued' &&
        ` · ${bookedFor && state === 'booked' ? `For episode ${bookedFor.number}` : stateWord[state]}`}
    </p>
  )
}

type Props = { questions: DeskQuestionView[]; chosen: string | null; hrefOf: (id: string) => string; caption: string }

/** The queue: how long an answer is of use comes first, how many are asking last. */
export function QueueTable({ questions, chosen, hrefOf, caption }: Props) {
  return (
    <Table caption={caption}>
      <thead>
        <tr>
          <HeadCell className="whitespace-nowrap">Useful for</HeadCell>
          <HeadCell className="max-md:hidden">Stage</HeadCell>
          <HeadCell>Question</HeadCell>
          <HeadCell>
            <span className="sr-only">How many are asking</span>
          </HeadCell>
        </tr>
      </thead>
      <tbody>
        {questions.map((question) => (
          <Row key={question.id} chosen={question.id === chosen}>
            <Cell className={question.useful.kind === 'now' ? 'font-semibold whitespace-nowrap' : 'whitespace-nowrap'}>
              {isOpen(question.state) ? usefulWords(question.useful) : ''}
            </Cell>
            <Cell className="max-md:hidden">
              <AskedStage question={question} />
            </Cell>
            <Cell>
              <Link
                href={hrefOf(question.id)}
                scroll={false}
                className="font-semibold text-ink no-underline hover:underline"
              >
                {question.title}
              </Link>
              <Beneath question={question} />
            </Cell>
            <Cell className="text-right whitespace-nowrap">{question.asking} asking</Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  )
}
