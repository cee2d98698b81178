import Link from 'next/link'
import { Cell, HeadCell, Row, Table } from '@/components/ui/table'
import { dateAndTime } from '@/lib/dates/when'
import { fullDay } from '@/lib/dates/rules'
import type { EpisodeLine } from '@/lib/episodes/views'

/** Where an episode stands, in one or two plain words. */
export function standing({ state, publishAt, channel }: EpisodeLine): string {
  if (state === 'scheduled' && publishAt) return `Goes out ${dateAndTime(publishAt, channel.timeZone)}`
  return { draft: 'Draft', scheduled: 'Scheduled', published: 'Published', withdrawn: 'Withdrawn' }[state]
}

/** A channel's episodes as its desk sees them. */
export function EpisodeTable({ episodes, caption }: { episodes: EpisodeLine[]; caption: string }) {
  return (
    <Table caption={caption}>
      <thead>
        <tr>
          <HeadCell>No.</HeadCell>
          <HeadCell>Episode</HeadCell>
          <HeadCell>Filmed</HeadCell>
          <HeadCell>Stands</HeadCell>
        </tr>
      </thead>
      <tbody>
        {episodes.map((episode) => (
          <Row key={episode.id}>
            <Cell className="figure text-ink-3">{episode.number}</Cell>
            <Cell>
              <Link href={`/desk/${episode.channel.slug}/episodes/${episode.id}`} className="font-semibold">
                {episode.title}
              </Link>
            </Cell>
            <Cell className="whitespace-nowrap">{episode.filmedOn ? fullDay(episode.filmedOn) : 'Not said'}</Cell>
            <Cell>{standing(episode)}</Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  )
}
