import { listEpisodes } from '@/lib/episodes/reads'
import { channelParams, episodeInput, episodesQuery } from '@/lib/episodes/schema'
import { createEpisode } from '@/lib/episodes/writes'
import { created } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint(
  { summary: 'Episodes of a channel, newest first', params: channelParams, query: episodesQuery },
  ({ actor, params, query }) => listEpisodes(actor, params.channel, query),
)

export const POST = endpoint(
  { summary: 'Make a draft', params: channelParams, input: episodeInput, creates: true },
  async ({ actor, params, input }) => {
    const episode = await createEpisode(actor, params.channel, input)
    return created(episode, { location: `/api/episodes/${episode.id}`, edition: episode.edition })
  },
)
