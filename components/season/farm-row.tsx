import Link from 'next/link'
import type { ChannelView } from '@/lib/channels/views'
import type { Day } from '@/lib/dates/rules'
import type { SeasonView } from '@/lib/seasons/views'
import { SeasonStrip } from './season-strip'

type FarmRowProps = { channel: ChannelView; season: SeasonView | null; today: Day }

/** A farm on the front page: who it is, and where its crops stand. */
export function FarmRow({ channel, season, today }: FarmRowProps) {
  return (
    <li className="grid gap-x-10 gap-y-4 px-3.5 py-5 md:px-5 lg:grid-cols-[minmax(0,1fr)_minmax(0,1.5fr)]">
      <div>
        <h3 className="text-xl">
          <Link href={channel.url} className="text-ink no-underline hover:underline">
            {channel.name}
          </Link>
        </h3>
        {channel.blurb && <p className="mt-1.5 max-w-measure text-ink-2">{channel.blurb}</p>}
      </div>
      {season && season.plantings.length > 0 ? (
        <div>
          <p className="eyebrow mb-2">The {season.year} season</p>
          <SeasonStrip season={season} today={today} />
        </div>
      ) : (
        <p className="text-sm text-ink-3">No season on the board yet.</p>
      )}
    </li>
  )
}
