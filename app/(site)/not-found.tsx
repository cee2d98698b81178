import { NotHere } from '@/components/frame/not-here'
import { isPerson } from '@/lib/auth/actor'
import { currentActor } from '@/lib/auth/current'

export default async function NotFoundOnSite() {
  return <NotHere signedIn={isPerson(await currentActor())} />
}
