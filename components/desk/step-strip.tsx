'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { useEpisode } from '@/lib/episodes/hooks'
import type { EpisodeView } from '@/lib/episodes/views'
import { deskSteps } from './step-rules'

type StepStripProps = { channel: string; episode: EpisodeView }

/** The work on one episode in its order, each step saying where it stands. */
export function StepStrip({ channel, episode: first }: StepStripProps) {
  const episode = useEpisode(first)
  const base = `/desk/${channel}/episodes/${episode.id}`
  const here = usePathname()
  return (
    // `relative` keeps words for screen readers, which are placed absolutely, inside what scrolls.
    <nav aria-label="Steps of this episode" className="sheet relative overflow-x-auto">
      <ol className="grid min-w-[46rem] grid-cols-5 divide-x divide-rule">
        {deskSteps(episode).map(({ slug, title, stands, done }) => {
          const href = `${base}/${slug}`
          const current = here === href || (slug === 'publish' && here === `${base}/answers`)
          return (
            <li key={slug}>
              <Link
                href={href}
                aria-current={current ? 'step' : undefined}
                className="block h-full px-4 py-3 text-ink no-underline hover:bg-mist hover:no-underline aria-[current]:bg-mist"
              >
                <span className="font-display text-lg font-semibold">
                  {title} {done && <span className="text-act">✓</span>}
                  {done && <span className="sr-only">, done</span>}
                </span>
                <span className="mt-0.5 block text-sm text-ink-2">{stands}</span>
              </Link>
            </li>
          )
        })}
      </ol>
    </nav>
  )
}
