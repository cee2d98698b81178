import type { Metadata } from 'next'
import Link from 'next/link'
import { cache } from 'react'
import { PageHead } from '@/components/frame/page-head'
import { AskedStage } from '@/components/questions/asked-stage'
import { AskingButton } from '@/components/questions/asking-button'
import { askedLine } from '@/components/questions/asked-line'
import { CautionNotes } from '@/components/questions/caution-notes'
import { QuestionPhotos } from '@/components/questions/question-photos'
import { QuestionStanding } from '@/components/questions/question-standing'
import { VerdictForm } from '@/components/questions/verdict-form'
import { isPerson } from '@/lib/auth/actor'
import { currentActor } from '@/lib/auth/current'
import { forPage } from '@/lib/http/page'
import { cautionsOf } from '@/lib/questions/hazard-rules'
import { readQuestion } from '@/lib/questions/reads'
import { questionIdOf } from '@/lib/questions/schema'
import { topicsAround } from '@/lib/questions/topic-reads'

type Props = PageProps<'/questions/[id]'>

/** Asked for twice, by the title and by the page; read once. */
const load = cache(async (id: string) => forPage(readQuestion(await currentActor(), questionIdOf(id))))

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: (await load((await params).id)).title }
}

export default async function QuestionPage({ params }: Props) {
  const [question, actor] = [await load((await params).id), await currentActor()]
  const { id, channel, title, body, photos, youAreAsking, followUp } = question
  return (
    <article className="page">
      <PageHead title={title} eyebrow={askedLine(question)} />
      <div className="grid gap-6 lg:grid-cols-[minmax(0,1fr)_20rem] lg:items-start">
        <div className="grid gap-5">
          <CautionNotes cautions={cautionsOf(question, await topicsAround(id))} />
          {body && <p className="max-w-measure whitespace-pre-line">{body}</p>}
          <QuestionPhotos photos={photos} />
          <QuestionStanding question={question} />
          {followUp && youAreAsking && <VerdictForm id={id} />}
        </div>
        <aside className="sheet grid gap-4 px-5 py-4" aria-label="About this question">
          <div>
            <AskedStage question={question} whole />
          </div>
          <AskingButton question={question} signedIn={isPerson(actor)} />
          <Link href={`/channels/${channel.slug}/questions`}>All questions to {channel.name}</Link>
        </aside>
      </div>
    </article>
  )
}
