import type { ReactNode } from 'react'
import { Frame, Main } from '@/components/frame/frame'
import { framePerson } from '@/components/frame/frame-person'
import { currentActor } from '@/lib/auth/current'

export default async function AdminLayout({ children }: { children: ReactNode }) {
  return (
    <Frame person={framePerson(await currentActor())}>
      <Main>{children}</Main>
    </Frame>
  )
}
