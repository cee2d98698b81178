import { correctionInput, idParams } from '@/lib/episodes/schema'
import { addCorrection } from '@/lib/episodes/writes'
import { created } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const POST = endpoint(
  { summary: 'Pin a correction at a time', params: idParams, input: correctionInput, creates: true },
  async ({ actor, params, input }) => {
    const episode = await addCorrection(actor, params.id, input)
    return created(episode, { location: `/api/episodes/${episode.id}`, edition: episode.edition })
  },
)
