import { idParams } from '@/lib/episodes/schema'
import { noContent } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { endToken } from '@/lib/people/self-writes'

export const DELETE = endpoint({ summary: 'End a token', params: idParams }, async ({ actor, params }) => {
  await endToken(actor, params.id)
  return noContent()
})
