import type { Metadata } from 'next'
import { ChaptersEditor } from '@/components/desk/chapters-editor'
import { ReadingsEditor } from '@/components/desk/readings-editor'
import { currentActor } from '@/lib/auth/current'
import { readDeskEpisode } from '@/lib/episodes/desk-reads'
import { forPage } from '@/lib/http/page'

export const metadata: Metadata = { title: 'Chapters' }

export default async function ChaptersPage({ params }: PageProps<'/desk/[channel]/episodes/[id]/chapters'>) {
  const { channel, id } = await params
  const episode = await forPage(readDeskEpisode(await currentActor(), channel, id))
  return (
    <section aria-labelledby="chapters">
      <h2 id="chapters" className="sr-only">
        Chapters
      </h2>
      <ChaptersEditor episode={episode} />
      <div className="mt-5">
        <ReadingsEditor episode={episode} />
      </div>
    </section>
  )
}
