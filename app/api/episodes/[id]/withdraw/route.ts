import { withdrawEpisode } from '@/lib/episodes/publish'
import { idParams } from '@/lib/episodes/schema'
import { tagged } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const POST = endpoint(
  { summary: 'Take an episode out of sight', params: idParams, edition: 'optional' },
  async ({ actor, params, edition }) => {
    const episode = await withdrawEpisode(actor, params.id, edition)
    return tagged(episode, episode.edition)
  },
)
