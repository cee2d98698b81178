import { channelParams } from '@/lib/episodes/schema'
import { Answer } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { invite } from '@/lib/people/invitations'
import { readPeople } from '@/lib/people/reads'
import { invitationInput } from '@/lib/people/schema'

export const GET = endpoint(
  { summary: 'People of a channel, for its owners', params: channelParams },
  ({ actor, params }) => readPeople(actor, params.channel),
)

export const POST = endpoint(
  { summary: 'Ask somebody into a channel by letter', params: channelParams, input: invitationInput },
  async ({ actor, params, input }) => {
    await invite(actor, params.channel, input)
    return new Answer(201, await readPeople(actor, params.channel))
  },
)
