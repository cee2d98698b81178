import type { Metadata } from 'next'
import { cache } from 'react'
import { DeskOnly } from '@/components/player/desk-only'
import { openAtOf } from '@/components/player/open-at'
import { episodeDescription, videoObject } from '@/components/player/video-object'
import { Watch } from '@/components/player/watch'
import { JsonLd } from '@/components/ui/json-ld'
import { currentActor } from '@/lib/auth/current'
import { env } from '@/lib/env'
import { readWatchPage } from '@/lib/episodes/watch-page'
import { forPage } from '@/lib/http/page'

type Props = PageProps<'/channels/[channel]/episodes/[slug]'>

/** Asked for twice, by the title and by the page; read once. */
const load = cache(async (channel: string, slug: string) => forPage(readWatchPage(await currentActor(), channel, slug)))

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { channel, slug } = await params
  const { episode } = await load(channel, slug)
  const poster = episode.film?.poster
  return {
    metadataBase: new URL(env().BASE_URL),
    title: `${episode.title} · ${episode.channel.name}`,
    description: episodeDescription(episode),
    alternates: { canonical: episode.url },
    openGraph: {
      type: 'video.other',
      title: episode.title,
      url: episode.url,
      images: poster ? [{ url: poster, alt: `A picture from the film ${episode.title}` }] : [],
    },
    robots: episode.state === 'published' ? undefined : { index: false, follow: false },
  }
}

export default async function WatchPage({ params, searchParams }: Props) {
  const { channel, slug } = await params
  const { episode, spoken, notes, askName } = await load(channel, slug)
  const described = videoObject(episode, spoken, env().BASE_URL)
  return (
    <article className="page">
      <DeskOnly episode={episode} />
      <Watch
        episode={episode}
        spoken={spoken}
        notes={notes}
        askName={askName}
        openAt={openAtOf((await searchParams).t)}
      />
      {described && <JsonLd data={described} />}
    </article>
  )
}
