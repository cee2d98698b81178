import { idParams } from '@/lib/episodes/schema'
import { footageOutput } from '@/lib/footage/schema'
import { retryFootage } from '@/lib/footage/writes'
import { accepted } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const POST = endpoint(
  { summary: 'Try failed footage again', params: idParams, output: footageOutput },
  async ({ actor, params }) => accepted(await retryFootage(actor, params.id)),
)
