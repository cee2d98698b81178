import { idParams } from '@/lib/episodes/schema'
import { tagged } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { readingsInput } from '@/lib/readings/schema'
import { saveReadings } from '@/lib/readings/writes'

export const PUT = endpoint(
  { summary: 'Replace the readings', params: idParams, input: readingsInput, edition: true },
  async ({ actor, params, input, edition }) => {
    const episode = await saveReadings(actor, params.id, input, edition)
    return tagged(episode, episode.edition)
  },
)
