import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { isOneOf, type Actor } from '@/lib/auth/actor'
import type { ChannelView } from '@/lib/channels/views'

/** A farm whose first season is not on the board yet. */
export function NoSeason({ channel, actor }: { channel: ChannelView; actor: Actor }) {
  const mayBegin = isOneOf(actor, channel.id, 'owner', 'editor')
  return (
    <EmptyState
      title="No season on the board yet"
      action={
        <>
          <ButtonLink href={`${channel.url}/episodes`} variant={mayBegin ? 'line' : 'primary'}>
            See the episodes
          </ButtonLink>
          {mayBegin && <ButtonLink href={`/desk/${channel.slug}/season`}>Begin a season</ButtonLink>}
        </>
      }
    >
      The farm’s year will stand here: a lane for each crop and field, its growth stages over the weeks, and each
      episode on the day it was filmed.
    </EmptyState>
  )
}
