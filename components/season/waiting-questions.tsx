import Link from 'next/link'
import { StageTag } from '@/components/ui/tag'
import { topicByCode } from '@/lib/topics/rules'
import type { QuestionView } from '@/lib/questions/views'
import { usefulSentence } from '@/lib/questions/urgency-rules'

/** Open questions as ruled rows: what is asked, how long an answer is of use, and last how many wait for it. */
export function WaitingQuestions({ questions, withFarm }: { questions: QuestionView[]; withFarm?: boolean }) {
  return (
    <ul className="ruled">
      {questions.map((question) => (
        <li key={question.id} className="py-3 first:pt-0 last:pb-0">
          <Link href={question.url}>{question.title}</Link>
          <p className="mt-1.5 flex flex-wrap items-center gap-x-2.5 gap-y-1 text-sm text-ink-3">
            <AskedStage question={question} />
            {[withFarm && question.channel.name, usefulSentence(question.useful), `${question.asking} asking`]
              .filter(Boolean)
              .join(' · ')}
          </p>
        </li>
      ))}
    </ul>
  )
}

function AskedStage({ question: { stage, crop } }: { question: QuestionView }) {
  const topic = stage ? topicByCode(stage) : null
  return topic?.stage ? <StageTag stage={topic.stage} crop={topic.crop ?? crop} /> : null
}
