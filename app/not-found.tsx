import type { Metadata } from 'next'
import { Frame, Main } from '@/components/frame/frame'
import { framePerson } from '@/components/frame/frame-person'
import { NotHere } from '@/components/frame/not-here'
import { currentActor } from '@/lib/auth/current'

export const metadata: Metadata = { title: 'Not found' }

export default async function NotFound() {
  const person = framePerson(await currentActor())
  return (
    <Frame person={person}>
      <Main>
        <NotHere signedIn={person !== null} />
      </Main>
    </Frame>
  )
}
