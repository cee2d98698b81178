import type { Metadata } from 'next'
import { EpisodeFilters } from '@/components/episodes/episode-filters'
import { EpisodeRow } from '@/components/episodes/episode-row'
import { filterAsked } from '@/components/episodes/filter-asked'
import { NoEpisodes } from '@/components/episodes/no-episodes'
import { PageHead } from '@/components/frame/page-head'
import { ButtonLink } from '@/components/ui/button'
import { currentActor } from '@/lib/auth/current'
import { readChannel } from '@/lib/channels/reads'
import { listEpisodes } from '@/lib/episodes/reads'
import { forPage } from '@/lib/http/page'
import { seasonYears } from '@/lib/seasons/reads'

type Props = PageProps<'/channels/[channel]/episodes'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { name } = await forPage(readChannel((await params).channel))
  return { title: `Episodes at ${name}` }
}

export default async function EpisodesPage({ params, searchParams }: Props) {
  const [{ channel: slug }, query, actor] = await Promise.all([params, searchParams, currentActor()])
  const channel = await forPage(readChannel(slug))
  const { cursor, ...filter } = filterAsked(query)
  const [{ items, nextCursor }, years] = await Promise.all([
    forPage(listEpisodes(actor, slug, { ...filter, cursor, limit: 25, state: 'published' })),
    seasonYears(channel.id),
  ])
  const here = `${channel.url}/episodes`
  const older = nextCursor && `${here}?${new URLSearchParams({ ...filter, cursor: nextCursor })}`
  return (
    <div className="page">
      <PageHead
        title={`Episodes at ${channel.name}`}
        lead="Newest first. Narrow them by season, crop, stage, job or subject."
      />
      <EpisodeFilters years={years} filter={filter} action={here} />
      {items.length === 0 ? (
        <NoEpisodes narrowed={Object.keys(filter).length > 0} channel={channel} />
      ) : (
        <ul className="sheet ruled">
          {items.map((episode) => (
            <EpisodeRow key={episode.id} episode={episode} level={2} />
          ))}
        </ul>
      )}
      {older && (
        <ButtonLink href={older} variant="line" className="mt-5">
          Older episodes
        </ButtonLink>
      )}
    </div>
  )
}
