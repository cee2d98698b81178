import type { Metadata } from 'next'
import { AnswersPanel } from '@/components/desk/answers-panel'
import { currentActor } from '@/lib/auth/current'
import { isOneOf } from '@/lib/auth/actor'
import { readChannel } from '@/lib/channels/reads'
import { readDeskEpisode } from '@/lib/episodes/desk-reads'
import { forPage } from '@/lib/http/page'
import { readQuestionsOf } from '@/lib/questions/booking-reads'

export const metadata: Metadata = { title: 'Questions it answers' }

export default async function AnswersPage({ params }: PageProps<'/desk/[channel]/episodes/[id]/answers'>) {
  const { channel, id } = await params
  const actor = await currentActor()
  const episode = await forPage(readDeskEpisode(actor, channel, id))
  const [questions, { id: channelId }] = await Promise.all([readQuestionsOf(actor, id), readChannel(channel)])
  return (
    <section aria-labelledby="answers" className="grid gap-4">
      <h2 id="answers">Questions this episode answers</h2>
      <AnswersPanel episode={episode} questions={questions} mayAnswer={isOneOf(actor, channelId, 'owner', 'editor')} />
    </section>
  )
}
