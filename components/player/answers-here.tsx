import Link from 'next/link'
import { PinMark } from './pin-mark'
import { TimeLink } from './time-link'

export type AnswerHere = {
  question: { id: string; title: string; url: string; askedOn: { number: number; title: string; url: string } | null }
  start: number
  end: number
  text: string
}

/** The questions that came back in this episode, each with its second and its short answer. */
export function AnswersHere({ answers }: { answers: AnswerHere[] }) {
  if (answers.length === 0) return null
  return (
    <section aria-labelledby="answers-here" className="mt-8">
      <h2 id="answers-here">This episode answers</h2>
      <ul className="sheet ruled mt-3">
        {answers.map(({ question, start, text }) => (
          <li key={question.id} className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-1.5 px-4.5 py-4">
            <PinMark kind="answered" className="-ml-2" />
            <div className="max-w-measure">
              <Link href={question.url} className="font-semibold text-ink no-underline hover:underline">
                {question.title}
              </Link>{' '}
              <TimeLink at={start} className="text-sm" />
              {text && <p className="mt-1 text-ink-2">{text}</p>}
              {question.askedOn && (
                <p className="mt-1 text-sm text-ink-3">
                  Asked on episode {question.askedOn.number},{' '}
                  <Link href={question.askedOn.url}>{question.askedOn.title}</Link>
                </p>
              )}
            </div>
          </li>
        ))}
      </ul>
    </section>
  )
}
