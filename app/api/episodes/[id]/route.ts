import { readEpisode } from '@/lib/episodes/reads'
import { episodePatch, idParams } from '@/lib/episodes/schema'
import { deleteEpisode, editEpisode } from '@/lib/episodes/writes'
import { noContent, tagged } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint({ summary: 'A whole episode', params: idParams }, async ({ actor, params }) => {
  const episode = await readEpisode(actor, params.id)
  return tagged(episode, episode.edition)
})

export const PATCH = endpoint(
  { summary: 'Edit what an episode is about', params: idParams, input: episodePatch, edition: true },
  async ({ actor, params, input, edition }) => {
    const episode = await editEpisode(actor, params.id, input, edition)
    return tagged(episode, episode.edition)
  },
)

export const DELETE = endpoint(
  { summary: 'Delete an episode that was never published', params: idParams, edition: 'optional' },
  async ({ actor, params, edition }) => {
    await deleteEpisode(actor, params.id, edition)
    return noContent()
  },
)
