import Link from 'next/link'
import { ButtonLink } from '@/components/ui/button'
import { dayAndMonth, yearOf, type Day } from '@/lib/dates/rules'
import type { QuestionView } from '@/lib/questions/views'
import type { FilmedEpisode } from '@/lib/seasons/views'
import { WaitingQuestions } from './waiting-questions'

type BesideBoardProps = {
  today: Day
  otherYears: FilmedEpisode[]
  waiting: QuestionView[]
  channel: { slug: string; url: string }
}

/** What stands under a season board: the same week in other years, and what waits for an answer. */
export function BesideBoard({ today, otherYears, waiting, channel }: BesideBoardProps) {
  return (
    <div className="sheet mt-6 grid divide-rule md:mt-7 md:grid-cols-[minmax(0,1fr)_minmax(0,1.4fr)] md:divide-x">
      <section className="border-b border-rule-2 p-4 md:border-b-0 md:p-5.5">
        <h2 className="mb-3">This week in other years</h2>
        {otherYears.length > 0 ? (
          <OtherYears episodes={otherYears} />
        ) : (
          <p className="text-ink-2">Nothing was filmed around {dayAndMonth(today)} in another year yet.</p>
        )}
      </section>
      <section className="p-4 md:p-5.5">
        <h2 className="mb-3">Waiting for an answer</h2>
        {waiting.length > 0 ? (
          <WaitingQuestions questions={waiting} />
        ) : (
          <p className="text-ink-2">
            No question is open. Ask one at the second of an episode, or from the questions page.
          </p>
        )}
        <p className="no-print mt-4 flex flex-wrap gap-2.5">
          <ButtonLink href={`/questions/ask?channel=${channel.slug}`} variant="line">
            Ask a question
          </ButtonLink>
          <ButtonLink href={`${channel.url}/questions`} variant="quiet">
            See all questions
          </ButtonLink>
        </p>
      </section>
    </div>
  )
}

function OtherYears({ episodes }: { episodes: FilmedEpisode[] }) {
  return (
    <ul className="ruled">
      {episodes.map(({ url, title, filmedOn }) => (
        <li key={url} className="grid grid-cols-[3.5rem_1fr] items-baseline py-2.5 first:pt-0">
          <span className="font-mono tabular-nums">{yearOf(filmedOn)}</span>
          <span>
            <Link href={url}>{title}</Link> <span className="text-sm text-ink-3">{dayAndMonth(filmedOn)}</span>
          </span>
        </li>
      ))}
    </ul>
  )
}
