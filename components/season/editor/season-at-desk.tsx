import { EmptyState } from '@/components/ui/empty-state'
import { Notice } from '@/components/ui/notice'
import type { Units } from '@/lib/auth/actor'
import type { DeskSeason } from '@/lib/seasons/views'
import { SeasonBoard } from '../season-board'
import { SeasonEditor } from './season-editor'

/** What the desk sees of a season: the form, the board to read for an adviser, or how to begin. */
export function SeasonAtDesk({ channel, season, today, mayEdit, units }: DeskSeason & { units: Units }) {
  if (!season) {
    return (
      <EmptyState title="No season on the board yet">
        {mayEdit
          ? 'Begin with a crop year. Then add a lane for each crop and field, and the days of its stages.'
          : 'The owner and the editors of this farm begin it.'}
      </EmptyState>
    )
  }
  // Keyed by season: another year is another form.
  if (mayEdit) return <SeasonEditor key={season.id} channel={channel.slug} season={season} units={units} />
  return (
    <div className="space-y-4">
      <Notice title="To read only">The owner and the editors of this farm set its season.</Notice>
      <SeasonBoard season={season} episodes={[]} today={today} units={units} episodesUrl={`${channel.url}/episodes`} />
    </div>
  )
}
