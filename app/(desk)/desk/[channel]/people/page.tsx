import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { InviteForm } from '@/components/people/invite-form'
import { MemberList } from '@/components/people/member-list'
import { currentActor } from '@/lib/auth/current'
import { fullDay } from '@/lib/dates/rules'
import { forPage } from '@/lib/http/page'
import { readPeople } from '@/lib/people/reads'

export const metadata: Metadata = { title: 'People' }

export default async function PeoplePage({ params }: PageProps<'/desk/[channel]/people'>) {
  const { channel } = await params
  const { members, invitations } = await forPage(readPeople(await currentActor(), channel), `/desk/${channel}/people`)
  return (
    <div className="page grid gap-5">
      <PageHead title="People" lead="Who works at this desk. A change counts from their very next step." />
      <MemberList channel={channel} members={members} />
      <h2>Ask somebody in</h2>
      <InviteForm channel={channel} />
      {invitations.length > 0 && (
        <ul aria-label="Asked, not here yet" className="sheet ruled">
          {invitations.map(({ id, email, role, expires }) => (
            <li key={id} className="px-5 py-3">
              {email} as {role}, <span className="text-ink-3">open until {fullDay(expires.slice(0, 10))}</span>
            </li>
          ))}
        </ul>
      )}
    </div>
  )
}
