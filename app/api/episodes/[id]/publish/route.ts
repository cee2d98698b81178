import { publishEpisode } from '@/lib/episodes/publish'
import { idParams, publishInput } from '@/lib/episodes/schema'
import { tagged } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const POST = endpoint(
  { summary: 'Publish now or at a time', params: idParams, input: publishInput, edition: true },
  async ({ actor, params, input, edition }) => {
    const episode = await publishEpisode(actor, params.id, input, edition)
    return tagged(episode, episode.edition)
  },
)
