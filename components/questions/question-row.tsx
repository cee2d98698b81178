import Link from 'next/link'
import { TimeCode } from '@/components/ui/time-code'
import { isOpen, stateWord } from '@/lib/questions/rules'
import { usefulSentence } from '@/lib/questions/urgency-rules'
import type { QuestionView } from '@/lib/questions/views'
import { AskedStage } from './asked-stage'

/** A question in a list: first how long an answer is of use and the stage, last how many are asking. */
export function QuestionRow({ question, withFarm }: { question: QuestionView; withFarm?: boolean }) {
  const { title, url, channel, state, useful, asking, followUp } = question
  return (
    <li className="grid gap-x-6 gap-y-1.5 px-4 py-4 md:grid-cols-[13rem_minmax(0,1fr)] md:px-5">
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1.5 md:flex-col md:items-start">
        {isOpen(state) && (
          <p className={useful.kind === 'now' ? 'font-semibold' : 'text-ink-2'}>{usefulSentence(useful)}</p>
        )}
        <AskedStage question={question} />
      </div>
      <div className="min-w-0">
        <Link href={url} className="text-lg leading-snug font-semibold text-ink no-underline hover:underline">
          {title}
        </Link>
        <p className="mt-1 text-sm text-ink-3">
          {[withFarm && channel.name, `${asking} asking`, !followUp && stateWord[state]].filter(Boolean).join(' · ')}
        </p>
        {followUp && (
          <p className="mt-1">
            <Link href={followUp.url}>
              Answered in episode {followUp.number} at <TimeCode seconds={followUp.start} />
            </Link>
          </p>
        )}
      </div>
    </li>
  )
}
