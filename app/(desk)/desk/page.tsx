import { redirect } from 'next/navigation'
import { currentActor } from '@/lib/auth/current'

/** The desk without a name: the first of this person's own. */
export default async function AnyDeskPage() {
  const actor = await currentActor()
  if (actor.id === null) redirect('/sign-in?callbackUrl=/desk')
  const first = actor.memberships[0]
  redirect(first ? `/desk/${first.slug}` : '/')
}
