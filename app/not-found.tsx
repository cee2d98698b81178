import type { Metadata } from 'next'
import { Frame, Main } from '@/components/frame/frame'
import { framePerson } from '@/components/frame/frame-person'
import { NotHere } from '@/components/frame/not-here'
import { currentActor } from '@/lib/auth/current'

export const metadata: Metadata = { title: 'Not found' }

export default async function NotFound() {
  return (
    <Frame person={framePerson(await currentActor())}>
      <Main>
        <NotHere />
      </Main>
    </Frame>
  )
}
