import type { Metadata } from 'next'
import Link from 'next/link'
import { PublishPanel } from '@/components/desk/publish-panel'
import { WalkRoundList } from '@/components/desk/walk-round-list'
import { currentActor } from '@/lib/auth/current'
import { readDeskEpisode } from '@/lib/episodes/desk-reads'
import { readWalkRound } from '@/lib/episodes/walk-round'
import { forPage } from '@/lib/http/page'

export const metadata: Metadata = { title: 'Publish' }

export default async function PublishPage({ params }: PageProps<'/desk/[channel]/episodes/[id]/publish'>) {
  const { channel, id } = await params
  const actor = await currentActor()
  const episode = await forPage(readDeskEpisode(actor, channel, id))
  const failing = (await readWalkRound(actor, id)).filter(({ ok }) => !ok)
  const base = `/desk/${channel}/episodes/${id}`
  return (
    <section aria-labelledby="publish" className="grid gap-5">
      <h2 id="publish" className="sr-only">
        Publish
      </h2>
      <p>
        <Link href={`${base}/answers`}>Questions this episode answers</Link>
      </p>
      {failing.length > 0 && <WalkRoundList base={base} lines={failing} />}
      <PublishPanel episode={episode} ready={failing.length === 0} />
    </section>
  )
}
