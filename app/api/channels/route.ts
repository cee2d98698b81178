import { listChannels } from '@/lib/channels/reads'
import { created } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { channelInput } from '@/lib/site/schema'
import { createChannel } from '@/lib/site/writes'

export const GET = endpoint({ summary: 'Every channel' }, async () => ({
  items: await listChannels(),
  nextCursor: null,
}))

export const POST = endpoint(
  { summary: 'Open a channel and ask its owner in; for the site admin', input: channelInput, creates: true },
  async ({ actor, input }) => {
    const channel = await createChannel(actor, input)
    return created(channel, { location: `/api/channels/${channel.slug}` })
  },
)
