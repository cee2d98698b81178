import type { Metadata } from 'next'
import Link from 'next/link'
import { EpisodeTable } from '@/components/desk/episode-table'
import { QuestionCounts } from '@/components/desk/question-counts'
import { PageHead } from '@/components/frame/page-head'
import { EmptyState } from '@/components/ui/empty-state'
import { Notice } from '@/components/ui/notice'
import { currentActor } from '@/lib/auth/current'
import { readToday } from '@/lib/episodes/desk-reads'
import { forPage } from '@/lib/http/page'

export const metadata: Metadata = { title: 'Today' }

export default async function TodayPage({ params }: PageProps<'/desk/[channel]'>) {
  const { channel } = await params
  const { drafts, scheduled, failed, counts } = await forPage(
    readToday(await currentActor(), channel),
    `/desk/${channel}`,
  )
  const open = [...scheduled, ...drafts]
  return (
    <div className="page grid gap-6">
      <PageHead title="Today" lead="What waits for you at this desk." />
      {failed.map(({ id, title, detail }) => (
        <Notice key={id} tone="failed" title={`The film of “${title}” could not be used.`}>
          {detail} <Link href={`/desk/${channel}/episodes/${id}/footage`}>See to it</Link>
        </Notice>
      ))}
      <QuestionCounts channel={channel} counts={counts} />
      <section aria-labelledby="on-the-bench" className="grid gap-3">
        <h2 id="on-the-bench">On the bench</h2>
        {open.length === 0 ? (
          <EmptyState
            level={3}
            title="Nothing on the bench"
            action={<Link href={`/desk/${channel}/episodes`}>Begin an episode</Link>}
          >
            Drafts and scheduled episodes stand here until they are out.
          </EmptyState>
        ) : (
          <EpisodeTable episodes={open} caption="Drafts and scheduled episodes" />
        )}
      </section>
    </div>
  )
}
