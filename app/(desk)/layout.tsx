import type { ReactNode } from 'react'
import { Frame } from '@/components/frame/frame'
import { framePerson } from '@/components/frame/frame-person'
import { currentActor } from '@/lib/auth/current'

/** The frame alone: each desk below puts its bar before its `Main`. */
export default async function DeskLayout({ children }: { children: ReactNode }) {
  return <Frame person={framePerson(await currentActor())}>{children}</Frame>
}
