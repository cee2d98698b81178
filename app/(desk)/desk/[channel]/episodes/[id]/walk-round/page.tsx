import type { Metadata } from 'next'
import { ConfirmCautions } from '@/components/desk/confirm-cautions'
import { WalkRoundList } from '@/components/desk/walk-round-list'
import { currentActor } from '@/lib/auth/current'
import { readDeskEpisode } from '@/lib/episodes/desk-reads'
import { readWalkRound } from '@/lib/episodes/walk-round'
import { forPage } from '@/lib/http/page'
import { cautionsFor } from '@/lib/topics/cautions'

export const metadata: Metadata = { title: 'Walk-round' }

export default async function WalkRoundPage({ params }: PageProps<'/desk/[channel]/episodes/[id]/walk-round'>) {
  const { channel, id } = await params
  const actor = await currentActor()
  const episode = await forPage(readDeskEpisode(actor, channel, id))
  const cautions = cautionsFor(episode.chapters.flatMap(({ topics }) => topics.map(({ code }) => code)))
  return (
    <section aria-labelledby="walk-round" className="grid gap-5">
      <h2 id="walk-round" className="sr-only">
        Walk-round
      </h2>
      {cautions.length > 0 && <ConfirmCautions episode={episode} cautions={cautions} />}
      <WalkRoundList base={`/desk/${channel}/episodes/${id}`} lines={await readWalkRound(actor, id)} />
    </section>
  )
}
