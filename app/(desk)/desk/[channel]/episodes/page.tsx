import type { Metadata } from 'next'
import { EpisodeTable } from '@/components/desk/episode-table'
import { NewEpisodeForm } from '@/components/desk/new-episode-form'
import { PageHead } from '@/components/frame/page-head'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { may } from '@/lib/auth/policy'
import { currentActor } from '@/lib/auth/current'
import { readDeskChannel } from '@/lib/channels/reads'
import { listEpisodes } from '@/lib/episodes/reads'
import { episodesQuery } from '@/lib/episodes/schema'
import { forPage } from '@/lib/http/page'

export const metadata: Metadata = { title: 'Episodes at the desk' }

export default async function DeskEpisodesPage({ params, searchParams }: PageProps<'/desk/[channel]/episodes'>) {
  const actor = await currentActor()
  const { channel: slug } = await params
  const channel = await forPage(readDeskChannel(actor, slug), `/desk/${slug}/episodes`)
  const { cursor } = await searchParams
  const query = episodesQuery.parse({ limit: 50, ...(typeof cursor === 'string' ? { cursor } : {}) })
  const { items, nextCursor } = await forPage(listEpisodes(actor, slug, query))
  return (
    <div className="page grid gap-5">
      <PageHead title="Episodes" lead="Drafts, scheduled, published and withdrawn, newest number first." />
      {may(actor, 'episode.create', channel) && <NewEpisodeForm channel={slug} />}
      {items.length === 0 ? (
        <EmptyState title="No episode yet">
          Give the first one a working title above. Then its film can be uploaded, and the rest follows step by step.
        </EmptyState>
      ) : (
        <EpisodeTable episodes={items} caption={`Episodes of ${channel.name}`} />
      )}
      {nextCursor && (
        <ButtonLink href={`?cursor=${nextCursor}`} variant="line" className="justify-self-start">
          Older episodes
        </ButtonLink>
      )}
    </div>
  )
}
