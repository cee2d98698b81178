import type { Metadata } from 'next'
import { CaptionsForm } from '@/components/desk/captions-form'
import { CueTable } from '@/components/desk/cue-table'
import { EmptyState } from '@/components/ui/empty-state'
import { currentActor } from '@/lib/auth/current'
import { readCaptions } from '@/lib/captions/reads'
import { readDeskEpisode } from '@/lib/episodes/desk-reads'
import { forPage } from '@/lib/http/page'

export const metadata: Metadata = { title: 'Captions' }

export default async function CaptionsPage({ params }: PageProps<'/desk/[channel]/episodes/[id]/captions'>) {
  const { channel, id } = await params
  const actor = await currentActor()
  const episode = await forPage(readDeskEpisode(actor, channel, id))
  const tracks = await Promise.all(episode.captions.map(({ language }) => readCaptions(actor, id, language)))
  return (
    <section aria-labelledby="captions" className="grid gap-5">
      <h2 id="captions" className="sr-only">
        Captions
      </h2>
      <CaptionsForm episode={episode} />
      {tracks.length === 0 ? (
        <EmptyState level={3} title="No captions yet">
          They are what many viewers read instead of hear, what the text beside the picture is set from, and what search
          finds. An episode with sound goes out only with captions.
        </EmptyState>
      ) : (
        tracks.map(({ view }) => <CueTable key={view.language} track={view} />)
      )}
    </section>
  )
}
