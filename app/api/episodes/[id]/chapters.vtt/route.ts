import { chaptersVtt } from '@/lib/chapters/files'
import { readEpisode } from '@/lib/episodes/reads'
import { idParams } from '@/lib/episodes/schema'
import { text } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint({ summary: 'Chapters as WebVTT', params: idParams }, async ({ actor, params }) =>
  text(chaptersVtt(await readEpisode(actor, params.id)), 'text/vtt'),
)
