import type { Metadata } from 'next'
import { NotHere } from '@/components/frame/not-here'
import { isPerson } from '@/lib/auth/actor'
import { currentActor } from '@/lib/auth/current'

export const metadata: Metadata = { title: 'Not found' }

export default async function NotFoundOnSite() {
  return <NotHere signedIn={isPerson(await currentActor())} />
}
