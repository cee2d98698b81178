import { chaptersInput } from '@/lib/chapters/schema'
import { saveChapters } from '@/lib/chapters/writes'
import { idParams } from '@/lib/episodes/schema'
import { tagged } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const PUT = endpoint(
  { summary: 'Replace the chapters', params: idParams, input: chaptersInput, edition: true },
  async ({ actor, params, input, edition }) => {
    const episode = await saveChapters(actor, params.id, input, edition)
    return tagged(episode, episode.edition)
  },
)
