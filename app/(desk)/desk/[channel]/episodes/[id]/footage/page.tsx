import type { Metadata } from 'next'
import { FootageDesk } from '@/components/desk/footage-desk'
import { currentActor } from '@/lib/auth/current'
import { readDeskEpisode } from '@/lib/episodes/desk-reads'
import { maySendFootage, readFootageIfAny } from '@/lib/footage/reads'
import { forPage } from '@/lib/http/page'

export const metadata: Metadata = { title: 'Footage' }

export default async function FootagePage({ params }: PageProps<'/desk/[channel]/episodes/[id]/footage'>) {
  const { channel, id } = await params
  const actor = await currentActor()
  const { film } = await forPage(readDeskEpisode(actor, channel, id))
  const footage = await forPage(readFootageIfAny(actor, id))
  return (
    <section aria-labelledby="footage" className="grid gap-5">
      <h2 id="footage" className="sr-only">
        Footage
      </h2>
      <FootageDesk episodeId={id} first={footage} hasFilm={film !== null} maySend={await maySendFootage(actor, id)} />
    </section>
  )
}
