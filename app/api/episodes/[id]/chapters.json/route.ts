import { chaptersJson } from '@/lib/chapters/files'
import { readEpisode } from '@/lib/episodes/reads'
import { idParams } from '@/lib/episodes/schema'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint(
  { summary: 'Chapters as Podcasting 2.0 JSON', params: idParams },
  async ({ actor, params }) =>
    new Response(JSON.stringify(chaptersJson(await readEpisode(actor, params.id))), {
      headers: { 'Content-Type': 'application/json+chapters; charset=utf-8' },
    }),
)
