import Link from 'next/link'
import type { ReactNode } from 'react'
import type { EpisodeView } from '@/lib/episodes/views'
import { dayAndMonth } from '@/lib/dates/rules'

type WatchHeadProps = {
  episode: EpisodeView
  /** What can hurt somebody in this work; stands at the head of the episode. */
  cautions: ReactNode
  /** The page's action. */
  children: ReactNode
}

/** Where the episode stands, its title, the cautions of its work, and the page's action. */
export function WatchHead({ episode, cautions, children }: WatchHeadProps) {
  const { channel, season, number, filmedOn, duration } = episode
  const facts = [
    season && `${season} season`,
    `episode ${number}`,
    filmedOn && `filmed ${dayAndMonth(filmedOn)}`,
    duration && lengthWords(duration),
  ].filter(Boolean)
  return (
    <div className="order-3 flex flex-wrap items-end justify-between gap-x-8 gap-y-4 px-3.5 pt-3.5 pb-3 lg:col-span-2 lg:row-start-1 lg:px-0 lg:pt-6.5 lg:pb-4.5">
      <div className="flex min-w-0 flex-col-reverse lg:flex-col">
        <p className="eyebrow mt-1.5 lg:mt-0 lg:mb-1.5">
          <Link href={`/channels/${channel.slug}`} className="text-inherit no-underline hover:underline">
            {channel.name}
          </Link>
          {facts.map((fact) => ` · ${fact}`)}
        </p>
        <h1 className="max-w-[22ch]">{episode.title}</h1>
      </div>
      {children}
      <div className="w-full empty:hidden">{cautions}</div>
    </div>
  )
}

const lengthWords = (seconds: number) => (seconds < 60 ? `${Math.round(seconds)} s` : `${Math.round(seconds / 60)} min`)
