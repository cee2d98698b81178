import { fullDay } from '@/lib/dates/rules'
import type { QuestionEventView } from '@/lib/questions/views'

const words: Record<string, string> = {
  ask: 'asked it',
  queue: 'put it in the queue',
  join: 'joined it to another',
  'set-aside': 'set it aside',
  'ask-detail': 'asked for detail',
  'to-adviser': 'sent it to the adviser',
  book: 'booked it',
  answer: 'gave the answer’s range',
  publish: 'answered it',
  return: 'put it back in the queue',
  reopen: 'opened it again',
  verdict: 'said that it is settled',
}

/** Who did what with the question, when and why. */
export function QuestionHistory({ events }: { events: QuestionEventView[] }) {
  if (events.length === 0) return null
  return (
    <details className="border-t border-rule-2 pt-3">
      <summary className="flex min-h-11 items-center text-water underline">
        History, {events.length} {events.length === 1 ? 'entry' : 'entries'}
      </summary>
      <ol className="ruled mt-1 text-sm">
        {events.map(({ id, move, by, on, detail }) => (
          <li key={id} className="py-2">
            <p>
              {by ?? 'Turnrow'} {words[move] ?? move} · <time dateTime={on}>{fullDay(on.slice(0, 10))}</time>
            </p>
            {detail && <p className="text-ink-2">{detail}</p>}
          </li>
        ))}
      </ol>
    </details>
  )
}
