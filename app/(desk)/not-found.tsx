import { Main } from '@/components/frame/frame'
import { NotHere } from '@/components/frame/not-here'
import { isPerson } from '@/lib/auth/actor'
import { currentActor } from '@/lib/auth/current'

export default async function NotFoundAtDesk() {
  return (
    <Main>
      <NotHere signedIn={isPerson(await currentActor())} />
    </Main>
  )
}
