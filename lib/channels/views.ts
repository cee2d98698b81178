import type { Channel } from '@/models/channel'

export type ChannelView = { id: string; slug: string; name: string; blurb: string; timeZone: string; url: string }

export const channelView = ({ id, slug, name, blurb, timeZone }: Channel): ChannelView => ({
  id,
  slug,
  name,
  blurb,
  timeZone,
  url: `/channels/${slug}`,
})
