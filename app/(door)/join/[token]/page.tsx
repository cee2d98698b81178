import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { JoinForm } from '@/components/people/join-form'
import { ButtonLink } from '@/components/ui/button'
import { currentActor } from '@/lib/auth/current'
import { readInvitation } from '@/lib/people/invitations'

export const metadata: Metadata = { title: 'An invitation', robots: { index: false }, referrer: 'no-referrer' }

export default async function JoinPage({ params }: PageProps<'/join/[token]'>) {
  const { token } = await params
  const [offered, actor] = await Promise.all([readInvitation(token), currentActor()])
  if (!offered)
    return (
      <PageHead
        title="This invitation is used or over"
        lead="Ask an owner of the farm’s desk for a new one. Nothing else has changed."
      />
    )
  return (
    <>
      <PageHead title={`${offered.channelName} asks you in`} lead={`You would work at its desk as ${offered.role}.`} />
      {actor.id === null ? (
        <ButtonLink href={`/sign-in?callbackUrl=/join/${encodeURIComponent(token)}`}>Sign in to accept</ButtonLink>
      ) : (
        <JoinForm token={token} />
      )}
    </>
  )
}
