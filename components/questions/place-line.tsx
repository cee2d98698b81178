import Link from 'next/link'
import { TimeCode } from '@/components/ui/time-code'

type Place = {
  episode: { number: number; title: string; slug: string }
  channel: { slug: string }
  at: number | null
  chapter: string | null
}

/** "About episode 9, Is this wheat stand worth keeping, at 3:12 (Throwing the hoop)". */
export function placeLine({ episode, channel, at, chapter }: Place) {
  const url = `/channels/${channel.slug}/episodes/${episode.slug}${at === null ? '' : `?t=${at}`}`
  return (
    <p>
      About{' '}
      <Link href={url}>
        episode {episode.number}, {episode.title}
        {at !== null && (
          <>
            {', at '}
            <TimeCode seconds={at} />
          </>
        )}
      </Link>
      {chapter && `, “${chapter}”`}. Crop and stage are filled in from there.
    </p>
  )
}
