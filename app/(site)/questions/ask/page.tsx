import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { AskForm } from '@/components/questions/ask-form'
import { type Query, askAsked } from '@/components/questions/ask-asked'
import { placeLine } from '@/components/questions/place-line'
import { isPerson } from '@/lib/auth/actor'
import { currentActor } from '@/lib/auth/current'
import { listChannels } from '@/lib/channels/reads'
import { forPage } from '@/lib/http/page'
import { readAskPlace } from '@/lib/questions/place-reads'

export const metadata: Metadata = { title: 'Ask a question', robots: { index: false } }

export default async function AskPage({ searchParams }: PageProps<'/questions/ask'>) {
  const asked: Query = await searchParams
  const { episodeId, at, fields, here } = askAsked(asked)
  const actor = await currentActor()
  const place = episodeId ? await forPage(readAskPlace(actor, episodeId, at)) : null
  const channels = (await listChannels()).map(({ slug, name }) => ({ slug, name }))
  const filled = place
    ? { ...fields, channel: place.channel.slug, about: fields.about || (place.stage ?? place.crop ?? '') }
    : fields
  return (
    <div className="page">
      <PageHead
        title={place ? `Ask ${place.channel.name}` : 'Ask a question'}
        lead={place ? placeLine(place) : 'It goes to the farm’s desk, and comes back answered in a later episode.'}
      />
      <AskForm
        channels={channels}
        fields={filled}
        fixedChannel={place !== null}
        signedIn={isPerson(actor)}
        here={here}
      />
    </div>
  )
}
