'use server'

import { redirect } from 'next/navigation'
import { currentActor } from '@/lib/auth/current'
import { Problem } from '@/lib/errors'
import { acceptInvitation } from './invitations'

export type JoinState = { refused: string | null }

/** Accepts an invitation and leads to the desk. */
export async function join(token: string): Promise<JoinState> {
  const actor = await currentActor()
  const accepted = await acceptInvitation(actor, token).catch((failure: unknown) => {
    if (failure instanceof Problem) return failure
    throw failure
  })
  if (accepted instanceof Problem) return { refused: accepted.detail }
  redirect(`/desk/${accepted}`)
}
