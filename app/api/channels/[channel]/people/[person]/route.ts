import { noContent } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { changeRole, removeMember } from '@/lib/people/channel-writes'
import { memberParams, rolePatch } from '@/lib/people/schema'

export const PATCH = endpoint(
  { summary: 'Change a role', params: memberParams, input: rolePatch },
  async ({ actor, params, input }) => {
    await changeRole(actor, params.channel, params.person, input.role)
    return noContent()
  },
)

export const DELETE = endpoint(
  { summary: 'Take somebody off a channel', params: memberParams },
  async ({ actor, params }) => {
    await removeMember(actor, params.channel, params.person)
    return noContent()
  },
)
