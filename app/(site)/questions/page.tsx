import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { listAsked } from '@/components/questions/list-asked'
import { QuestionFilters } from '@/components/questions/question-filters'
import { QuestionList } from '@/components/questions/question-list'
import { ButtonLink } from '@/components/ui/button'
import { currentActor } from '@/lib/auth/current'
import { listChannels } from '@/lib/channels/reads'
import { forPage } from '@/lib/http/page'
import { readQuestions } from '@/lib/questions/reads'

export const metadata: Metadata = {
  title: 'Questions',
  description: 'What viewers have asked the farms, and where it was answered, to the second.',
}

export default async function QuestionsPage({ searchParams }: PageProps<'/questions'>) {
  const { query, filter, state } = listAsked(await searchParams)
  const actor = await currentActor()
  const [page, channels] = await Promise.all([forPage(readQuestions(actor, query)), listChannels()])
  return (
    <div className="page">
      <PageHead
        title="Questions"
        lead="Asked by viewers, answered in a later episode. First what many are asking and what is of use soonest."
        actions={<ButtonLink href="/questions/ask">Ask a question</ButtonLink>}
      />
      <QuestionFilters channels={channels} filter={filter} action="/questions" />
      <QuestionList
        page={page}
        state={state}
        withFarm
        askUrl="/questions/ask"
        moreUrl={(cursor) => `/questions?${new URLSearchParams({ ...filter, cursor })}`}
      />
    </div>
  )
}
