import type { ReactNode } from 'react'
import { DeskBar } from '@/components/frame/desk-bar'
import { Main } from '@/components/frame/frame'
import { isOneOf } from '@/lib/auth/actor'
import { currentActor } from '@/lib/auth/current'
import { readDeskChannel } from '@/lib/channels/reads'
import { forPage } from '@/lib/http/page'

type Props = { children: ReactNode; params: Promise<{ channel: string }> }

export default async function ChannelDeskLayout({ children, params }: Props) {
  const actor = await currentActor()
  const { channel: slug } = await params
  const channel = await forPage(readDeskChannel(actor, slug), `/desk/${slug}`)
  return (
    <>
      <DeskBar channel={channel} people={isOneOf(actor, channel.id, 'owner')} />
      <Main>{children}</Main>
    </>
  )
}
