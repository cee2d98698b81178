import type { Metadata } from 'next'
import { AboutForm } from '@/components/desk/about-form'
import { currentActor } from '@/lib/auth/current'
import { readDeskEpisode } from '@/lib/episodes/desk-reads'
import { forPage } from '@/lib/http/page'

export const metadata: Metadata = { title: 'Title, date and summary' }

export default async function AboutPage({ params }: PageProps<'/desk/[channel]/episodes/[id]'>) {
  const { channel, id } = await params
  const episode = await forPage(readDeskEpisode(await currentActor(), channel, id))
  return <AboutForm episode={episode} />
}
