import { noContent } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { endOtherSessions } from '@/lib/people/self-writes'

export const DELETE = endpoint({ summary: 'End every other sign-in of yours' }, async ({ actor }) => {
  await endOtherSessions(actor)
  return noContent()
})
