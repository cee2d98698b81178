import { actorOf } from '@/lib/auth/actor-of-request'
import { requirePerson } from '@/lib/auth/policy'
import { endpoint } from '@/lib/http/endpoint'
import { selfPatch } from '@/lib/people/schema'
import { editSelf } from '@/lib/people/self-writes'
import { meView } from '@/lib/people/views'

export const GET = endpoint({ summary: 'The person who is signed in, with their channels' }, ({ actor }) =>
  meView(requirePerson(actor)),
)

export const PATCH = endpoint(
  { summary: 'Change how you are called and the units you read', input: selfPatch },
  async ({ actor, input, request }) => {
    await editSelf(actor, input)
    return meView(requirePerson(await actorOf(request)))
  },
)
