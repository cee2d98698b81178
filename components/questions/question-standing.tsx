import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import { isOpen, stateWord } from '@/lib/questions/rules'
import { usefulSentence } from '@/lib/questions/urgency-rules'
import type { QuestionView } from '@/lib/questions/views'
import { TheTurn } from './the-turn'

/** Where a question stands: its answer, or what is happening with it. */
export function QuestionStanding({ question }: { question: QuestionView }) {
  const { state, followUp, joinedInto, setAsideReason, useful } = question
  if (followUp)
    return (
      <section aria-labelledby="answer" className="sheet px-5 py-4">
        <h2 id="answer">The answer</h2>
        <p className="mt-2 max-w-measure whitespace-pre-line">{followUp.text}</p>
        <div className="mt-3 border-t border-rule-2">
          <TheTurn question={question} />
        </div>
      </section>
    )
  if (joinedInto)
    return (
      <Notice title="Joined to another question that asks the same">
        <Link href={joinedInto.url}>{joinedInto.title}</Link>. Everybody asking here is told when that one is answered.
      </Notice>
    )
  if (state === 'answered')
    return (
      <Notice title="Answered">
        The episode that answers it is not on show at the moment. Its place comes back here with it.
      </Notice>
    )
  if (setAsideReason) return <Notice title="Set aside by the farm">{setAsideReason}</Notice>
  return <Notice title={stateWord[state]}>{isOpen(state) && `${usefulSentence(useful)}.`}</Notice>
}
