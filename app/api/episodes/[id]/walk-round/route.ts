import { idParams } from '@/lib/episodes/schema'
import { readWalkRound } from '@/lib/episodes/walk-round'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint(
  { summary: 'What stands between an episode and publication', params: idParams },
  ({ actor, params }) => readWalkRound(actor, params.id),
)
