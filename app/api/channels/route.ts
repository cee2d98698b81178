import { listChannels } from '@/lib/channels/reads'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint({ summary: 'Every channel' }, async () => ({
  items: await listChannels(),
  nextCursor: null,
}))
