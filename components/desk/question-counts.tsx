import Link from 'next/link'
import type { WaitingCounts } from '@/lib/episodes/views'

const lines = ({ newQuestions, queued, booked }: WaitingCounts) => [
  { state: 'new', count: newQuestions, words: newQuestions === 1 ? 'new question to sort' : 'new questions to sort' },
  { state: 'queued', count: queued, words: 'in the queue' },
  { state: 'booked', count: booked, words: 'booked for an episode' },
]

/** How many questions wait at a desk, and the way to them. */
export function QuestionCounts({ channel, counts }: { channel: string; counts: WaitingCounts }) {
  return (
    <section aria-labelledby="questions-waiting" className="grid gap-3">
      <h2 id="questions-waiting">Questions</h2>
      <ul className="sheet grid divide-rule max-md:divide-y md:grid-cols-3 md:divide-x">
        {lines(counts).map(({ state, count, words }) => (
          <li key={state}>
            <Link
              href={`/desk/${channel}/questions?state=${state}`}
              className="flex items-baseline gap-3 px-5 py-4 text-ink no-underline hover:bg-mist"
            >
              <span className="figure text-2xl">{count}</span>
              <span>{words}</span>
            </Link>
          </li>
        ))}
      </ul>
    </section>
  )
}
