import { readChannel } from '@/lib/channels/reads'
import { channelParams } from '@/lib/episodes/schema'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint({ summary: 'One channel', params: channelParams }, ({ params }) =>
  readChannel(params.channel),
)
