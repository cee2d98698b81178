import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'

/** A list of episodes with nothing in it: because of what was picked, or because nothing is published yet. */
export function NoEpisodes({ narrowed, channel }: { narrowed: boolean; channel: { name: string; url: string } }) {
  if (narrowed) {
    return (
      <EmptyState
        title="No episode fits all of these"
        action={
          <ButtonLink href={`${channel.url}/episodes`} variant="line">
            Show all episodes
          </ButtonLink>
        }
      >
        Take one of them away, or look over all farms with the search at the head of the page.
      </EmptyState>
    )
  }
  return (
    <EmptyState title="No episode is published yet">
      What {channel.name} films will stand here, each with its number, its day and the stages it shows.
    </EmptyState>
  )
}
