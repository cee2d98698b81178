import Link from 'next/link'
import { askedLine } from '@/components/questions/asked-line'
import { AskedStage } from '@/components/questions/asked-stage'
import { CautionNotes } from '@/components/questions/caution-notes'
import { QuestionPhotos } from '@/components/questions/question-photos'
import { cautionsOf } from '@/lib/questions/hazard-rules'
import { stateWord } from '@/lib/questions/rules'
import { usefulSentence } from '@/lib/questions/urgency-rules'
import type { ComingEpisode, DeskQuestionView, LikenessView, QuestionEventView } from '@/lib/questions/views'
import { QuestionFacts } from './question-facts'
import { QuestionHistory } from './question-history'
import { QuestionMoves } from './question-moves'
import { SameQuestion } from './same-question'

type Props = {
  question: DeskQuestionView
  history: QuestionEventView[]
  alike: LikenessView[]
  coming: ComingEpisode[]
  mayBook: boolean
}

/** The question that stands open beside the queue, and what can be done with it. */
export function QueueSheet({ question, history, alike, coming, mayBook }: Props) {
  const { title, body, url, photos, useful, state } = question
  return (
    <article className="sheet grid content-start gap-4 px-5 py-5" aria-labelledby="chosen">
      <div>
        <p className="eyebrow">{askedLine(question)}</p>
        <h2 id="chosen" className="mt-1.5">
          {title}
        </h2>
      </div>
      <CautionNotes cautions={cautionsOf(question, [])} />
      {body && <p className="whitespace-pre-line">{body}</p>}
      <QuestionPhotos photos={photos} />
      <QuestionFacts
        facts={[
          [
            'Crop stage',
            question.stage || question.crop ? <AskedStage key="stage" question={question} whole /> : 'Not said',
          ],
          ['Useful', usefulSentence(useful)],
          ['Stands', stateWord[state]],
          ...standingFacts(question),
          ['Asking', `${question.asking}${question.joined > 0 ? `, with ${question.joined} joined` : ''}`],
        ]}
      />
      {question.moves.includes('join') && <SameQuestion id={question.id} alike={alike} />}
      <QuestionMoves key={question.id} question={question} coming={coming} mayBook={mayBook} />
      <QuestionHistory events={history} />
      <Link href={url}>As everybody sees it</Link>
    </article>
  )
}

function standingFacts({ bookedFor, setAsideReason, joinedInto, settled, state, followUp }: DeskQuestionView) {
  const facts: [string, React.ReactNode][] = []
  if (bookedFor && state === 'booked') facts.push(['For', `Episode ${bookedFor.number}, ${bookedFor.title}`])
  if (setAsideReason) facts.push(['Because', setAsideReason])
  if (joinedInto)
    facts.push([
      'Joined to',
      <Link key="into" href={`?question=${joinedInto.id}`}>
        {joinedInto.title}
      </Link>,
    ])
  if (followUp)
    facts.push([
      'Answered',
      <Link key="answer" href={followUp.url}>
        Episode {followUp.number}
      </Link>,
    ])
  if (state === 'answered') facts.push(['Settled for', `${settled.yes} of those asking`])
  return facts
}
