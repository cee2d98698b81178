import Link from 'next/link'
import { buttonClass } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { fullDay, todayIn } from '@/lib/dates/rules'
import type { EpisodeView } from '@/lib/episodes/views'

/** Says that this is not the public page: what it is, and where to go on with it. */
export function DeskOnly({ episode }: { episode: EpisodeView }) {
  if (episode.state === 'published') return null
  return (
    <Notice
      title="Only the desk sees this"
      className="mt-4"
      action={
        <Link href={`/desk/${episode.channel.slug}/episodes/${episode.id}`} className={buttonClass('line')}>
          Open it at the desk
        </Link>
      }
    >
      {whyNotPublic(episode)}
    </Notice>
  )
}

function whyNotPublic({ state, publishAt, channel }: EpisodeView): string {
  if (state === 'scheduled' && publishAt) {
    return `It is published by itself on ${fullDay(todayIn(channel.timeZone, new Date(publishAt)))}.`
  }
  if (state === 'withdrawn') return 'It was withdrawn. Links to it say that it is not there.'
  return 'It is a draft. This is how it will look.'
}
