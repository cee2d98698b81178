'use client'

import Link from 'next/link'
import { chapterAt } from '@/lib/captions/rules'
import { useMoment } from './playback-context'
import { PinMark } from './pin-mark'
import { followUpPlace, type RowChapter, type RowQuestion } from './row-rules'
import { TimeLink } from './time-link'

type QuestionsPanelProps = { questions: RowQuestion[]; chapters: RowChapter[] }

/** The questions asked in the chapter that plays, with where each stands; those of the other chapters below. */
export function QuestionsPanel({ questions, chapters }: QuestionsPanelProps) {
  const current = useMoment((moment) => chapterAt(chapters, moment.at))
  const isHere = (question: RowQuestion) => question.at !== null && chapterAt(chapters, question.at) === current
  const here = questions.filter(isHere)
  const elsewhere = questions.filter((question) => !isHere(question))
  return (
    <>
      <h2 className="mb-2.5 text-lg">Questions on this stretch</h2>
      {here.length === 0 && <p className="text-ink-3">Nobody has asked about this chapter yet.</p>}
      <QuestionList questions={here} />
      {elsewhere.length > 0 && (
        <>
          <h3 className="mt-4 mb-1 font-text text-sm font-semibold tracking-normal text-ink-3">In other chapters</h3>
          <QuestionList questions={elsewhere} />
        </>
      )}
    </>
  )
}

function QuestionList({ questions }: { questions: RowQuestion[] }) {
  return (
    <ul className="grid gap-3">
      {questions.map((question) => (
        <li key={question.id} className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-1.5">
          <PinMark kind={question.followUp ? 'answered' : 'waiting'} className="-ml-2.5" />
          <div>
            <Link href={question.url} className="text-ink no-underline hover:underline">
              {question.title}
            </Link>{' '}
            {question.at !== null && <TimeLink at={question.at} className="text-sm whitespace-nowrap" />}
            <WhereItStands question={question} />
          </div>
        </li>
      ))}
    </ul>
  )
}

function WhereItStands({ question }: { question: RowQuestion }) {
  if (!question.followUp) {
    return (
      <span className="block text-sm text-ink-3">
        {question.asking} asking, {stateWords[question.state] ?? question.state}
      </span>
    )
  }
  return (
    <span className="flex items-center gap-1.5">
      <Turn />
      <Link href={question.followUp.url}>Answered in {followUpPlace(question.followUp)}</Link>
    </span>
  )
}

/** The mark's two rows, turned round: the question has come back. */
const Turn = () => (
  <svg width="16" height="14" viewBox="0 0 16 14" fill="none" className="shrink-0 stroke-flag" aria-hidden="true">
    <path d="M1 1.5h8a5.5 5.5 0 0 1 0 11H1M1 5h8a2 2 0 0 1 0 4H1" strokeWidth="1.6" />
  </svg>
)

const stateWords: Record<string, string> = {
  new: 'new at the desk',
  queued: 'in the queue',
  booked: 'booked for a coming episode',
  answered: 'answered',
  'set-aside': 'set aside',
  joined: 'joined to another question',
}
