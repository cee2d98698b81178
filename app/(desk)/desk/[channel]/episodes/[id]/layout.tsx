import type { ReactNode } from 'react'
import { EpisodeHead } from '@/components/desk/episode-head'
import { StepStrip } from '@/components/desk/step-strip'
import { currentActor } from '@/lib/auth/current'
import { readDeskEpisode } from '@/lib/episodes/desk-reads'
import { forPage } from '@/lib/http/page'

type Props = { children: ReactNode; params: Promise<{ channel: string; id: string }> }

export default async function EpisodeDeskLayout({ children, params }: Props) {
  const { channel, id } = await params
  const episode = await forPage(readDeskEpisode(await currentActor(), channel, id))
  return (
    <div className="page grid gap-5 [&>*]:min-w-0">
      <EpisodeHead channel={channel} episode={episode} />
      <StepStrip channel={channel} episode={episode} />
      {children}
    </div>
  )
}
