import { idParams } from '@/lib/episodes/schema'
import { readFootage } from '@/lib/footage/reads'
import { footageOutput } from '@/lib/footage/schema'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint(
  { summary: 'Where the footage of an episode stands', params: idParams, output: footageOutput },
  ({ actor, params }) => readFootage(actor, params.id),
)
