import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { listAsked } from '@/components/questions/list-asked'
import { QuestionFilters } from '@/components/questions/question-filters'
import { QuestionList } from '@/components/questions/question-list'
import { ButtonLink } from '@/components/ui/button'
import { currentActor } from '@/lib/auth/current'
import { readChannel } from '@/lib/channels/reads'
import { forPage } from '@/lib/http/page'
import { readQuestions } from '@/lib/questions/reads'

type Props = PageProps<'/channels/[channel]/questions'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { name } = await forPage(readChannel((await params).channel))
  return { title: `Questions to ${name}` }
}

export default async function ChannelQuestionsPage({ params, searchParams }: Props) {
  const [{ channel: slug }, asked, actor] = await Promise.all([params, searchParams, currentActor()])
  const channel = await forPage(readChannel(slug))
  const { query, filter, state } = listAsked(asked, slug)
  const page = await forPage(readQuestions(actor, query))
  const [here, askUrl] = [`${channel.url}/questions`, `/questions/ask?channel=${slug}`]
  return (
    <div className="page">
      <PageHead
        title={`Questions to ${channel.name}`}
        lead="First what many are asking and what is of use soonest on this farm."
        actions={<ButtonLink href={askUrl}>Ask {channel.name}</ButtonLink>}
      />
      <QuestionFilters filter={filter} action={here} />
      <QuestionList
        page={page}
        state={state}
        askUrl={askUrl}
        moreUrl={(cursor) => `${here}?${new URLSearchParams({ ...filter, cursor })}`}
      />
    </div>
  )
}
