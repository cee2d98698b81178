import type { Metadata } from 'next'
import { ChannelForm } from '@/components/admin/channel-form'
import { HealthList } from '@/components/admin/health-list'
import { PersonList } from '@/components/admin/person-list'
import { PageHead } from '@/components/frame/page-head'
import { Button, ButtonLink } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { currentActor } from '@/lib/auth/current'
import { forPage } from '@/lib/http/page'
import { readiness } from '@/lib/readiness'
import { listPeople } from '@/lib/site/reads'
import { peopleQuery } from '@/lib/site/schema'

export const metadata: Metadata = { title: 'This installation', robots: { index: false } }

export default async function AdminPage({ searchParams }: PageProps<'/admin'>) {
  const { q, cursor } = await searchParams
  const asked = peopleQuery.parse({
    ...(typeof q === 'string' && { q }),
    ...(typeof cursor === 'string' && { cursor }),
  })
  const { items, nextCursor } = await forPage(listPeople(await currentActor(), asked), '/admin')
  const { database, queue, storage, search, mail } = await readiness()
  return (
    <div className="page grid gap-6">
      <PageHead title="This installation" lead="Health, channels and people." />
      <HealthList parts={Object.entries({ database, queue, storage, search, mail })} />
      <h2>Channels</h2>
      <ChannelForm />
      <h2>People</h2>
      <form className="flex flex-wrap items-end gap-3" action="/admin">
        <TextField label="Name or address" name="q" defaultValue={asked.q ?? ''} />
        <Button type="submit" variant="line">
          Show
        </Button>
      </form>
      <PersonList people={items} />
      {nextCursor && (
        <ButtonLink
          variant="line"
          className="justify-self-start"
          href={`/admin?${new URLSearchParams({ ...(asked.q && { q: asked.q }), cursor: nextCursor })}`}
        >
          More people
        </ButtonLink>
      )}
    </div>
  )
}
