import type { Metadata } from 'next'
import { queueAsked } from '@/components/desk/queue-asked'
import { QueueFilters } from '@/components/desk/queue-filters'
import { QueueSheet } from '@/components/desk/queue-sheet'
import { QueueTable } from '@/components/desk/queue-table'
import { queueLead, QueueOrder } from '@/components/desk/queue-words'
import { PageHead } from '@/components/frame/page-head'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { currentActor } from '@/lib/auth/current'
import { forPage } from '@/lib/http/page'
import { readQueue, readQueueFigures, readSheet } from '@/lib/questions/desk-reads'

export const metadata: Metadata = { title: 'Question queue' }

export default async function QueuePage({ params, searchParams }: PageProps<'/desk/[channel]/questions'>) {
  const [{ channel }, asked, actor] = await Promise.all([params, searchParams, currentActor()])
  const { query, filter, chosen } = queueAsked(asked)
  const here = `/desk/${channel}/questions`
  const [page, figures] = await Promise.all([
    forPage(readQueue(actor, channel, query), here),
    forPage(readQueueFigures(actor, channel), here),
  ])
  const open = chosen ?? page.items[0]?.id ?? null
  const sheet = open ? await forPage(readSheet(actor, channel, open)) : null
  const href = (more: Record<string, string>) => `${here}?${new URLSearchParams({ ...filter, ...more })}`
  return (
    <div className="page grid gap-5 pb-5 [&>*]:min-w-0">
      <PageHead title="Question queue" lead={queueLead(figures)} />
      <QueueFilters filter={filter} action={here} />
      {page.items.length === 0 && !chosen ? (
        <EmptyState title="Nothing here">
          Questions stand here as soon as a viewer asks one, or this view is widened.
        </EmptyState>
      ) : (
        <div className="grid items-start gap-6 lg:grid-cols-[minmax(0,1fr)_25rem] [&>*]:min-w-0">
          <div className={chosen ? 'grid gap-4 max-lg:order-2' : 'grid gap-4'}>
            <QueueTable
              questions={page.items}
              chosen={open}
              hrefOf={(id) => href({ question: id, ...(query.cursor ? { cursor: query.cursor } : {}) })}
              caption="Questions"
            />
            {page.nextCursor && (
              <ButtonLink href={href({ cursor: page.nextCursor })} variant="line" className="justify-self-start">
                More questions
              </ButtonLink>
            )}
            {query.sort === 'urgency' && <QueueOrder />}
          </div>
          {/* On a narrow screen a question opens above the table once it is chosen, and not by itself. */}
          <div className={chosen ? undefined : 'max-lg:hidden'}>{sheet && <QueueSheet {...sheet} />}</div>
        </div>
      )}
    </div>
  )
}
