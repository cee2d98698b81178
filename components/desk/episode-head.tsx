'use client'

import Link from 'next/link'
import { PageHead } from '@/components/frame/page-head'
import { ButtonLink } from '@/components/ui/button'
import { useEpisode } from '@/lib/episodes/hooks'
import type { EpisodeView } from '@/lib/episodes/views'

/** The head of every page of an episode at the desk. */
export function EpisodeHead({ channel, episode: first }: { channel: string; episode: EpisodeView }) {
  const episode = useEpisode(first)
  const words = episode.state === 'published' ? 'See it as published' : 'See it as it will be'
  return (
    <PageHead
      title={episode.title}
      eyebrow={`Episode ${episode.number}${episode.season ? ` · ${episode.season} season` : ''}`}
      lead={<Link href={`/desk/${channel}/episodes/${episode.id}`}>Title, date and summary</Link>}
      actions={
        <ButtonLink variant="line" href={episode.url} prefetch={false}>
          {words}
        </ButtonLink>
      }
    />
  )
}
