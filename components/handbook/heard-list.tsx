import Link from 'next/link'
import { TimeCode } from '@/components/ui/time-code'
import type { HeardView } from '@/lib/handbook/views'

/** Where a term is said: the sentence, the second, the episode. Each opens at its second. */
export function HeardList({ heard }: { heard: HeardView[] }) {
  return (
    <ol className="sheet ruled">
      {heard.map(({ episode, at, text, url }) => (
        <li key={`${episode.id} ${at}`} className="px-4 py-3.5">
          <p>“{text}”</p>
          <p className="mt-1 text-sm text-ink-3">
            <Link href={url} className="inline-flex min-h-6 items-center gap-2">
              <TimeCode seconds={at} />
              {episode.title}
            </Link>
            {` · ${episode.channel.name}, episode ${episode.number}`}
          </p>
        </li>
      ))}
    </ol>
  )
}
