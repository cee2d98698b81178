import Link from 'next/link'
import { TimeCode } from '@/components/ui/time-code'
import { fullDay } from '@/lib/dates/rules'
import type { QuestionView } from '@/lib/questions/views'

/** "Asked by June P. on 22 March 2026 on episode 19 at 4:40". */
export function askedLine({ askedBy, askedAt, episode, at, channel }: QuestionView) {
  const who = askedBy ?? 'somebody who has left'
  return (
    <>
      {channel.name} · asked by {who} on {fullDay(askedAt.slice(0, 10))}
      {episode && (
        <>
          {' on '}
          <Link href={episode.url}>
            episode {episode.number}
            {at !== null && (
              <>
                {' at '}
                <TimeCode seconds={at} />
              </>
            )}
          </Link>
        </>
      )}
    </>
  )
}
