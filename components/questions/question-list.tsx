import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import type { Page } from '@/lib/http/paging'
import type { QuestionView } from '@/lib/questions/views'
import type { StateOffered } from './list-asked'
import { QuestionRow } from './question-row'

type Props = {
  page: Page<QuestionView>
  state: StateOffered
  moreUrl: (cursor: string) => string
  withFarm?: boolean
  askUrl: string
}

const none: Record<StateOffered, string> = {
  waiting: 'No question is waiting',
  answered: 'Nothing answered yet',
  all: 'No question yet',
}

/** A page of questions, or what will be here and how to begin. */
export function QuestionList({ page: { items, nextCursor }, state, moreUrl, withFarm, askUrl }: Props) {
  if (items.length === 0)
    return (
      <EmptyState title={none[state]} action={<ButtonLink href={askUrl}>Ask a question</ButtonLink>}>
        What viewers ask stands here until it comes back answered in a later episode. You can ask from the page of an
        episode, at the second you are watching, or from here.
      </EmptyState>
    )
  return (
    <>
      <ul className="sheet ruled">
        {items.map((question) => (
          <QuestionRow key={question.id} question={question} withFarm={withFarm} />
        ))}
      </ul>
      {nextCursor && (
        <ButtonLink href={moreUrl(nextCursor)} variant="line" className="mt-5">
          More questions
        </ButtonLink>
      )}
    </>
  )
}
