import { type Actor, isAtDesk } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { notFound } from '@/lib/errors'
import { Channel } from '@/models/channel'
import { type ChannelView, channelView } from './views'

/** Every channel of the installation, by name; channels are public. */
export async function listChannels(): Promise<ChannelView[]> {
  return (await Channel.findAll({ order: [['name', 'asc']] })).map(channelView)
}

/** @throws Problem 404 */
export async function channelBySlug(slug: string): Promise<Channel> {
  const channel = await Channel.findOne({ where: { slug } })
  if (!channel) throw notFound('This channel')
  return channel
}

/** @throws Problem 404 */
export const readChannel = async (slug: string): Promise<ChannelView> => channelView(await channelBySlug(slug))

/** The channel for somebody at its desk. @throws Problem 404 for everybody else, 401 for nobody */
export async function readDeskChannel(actor: Actor, slug: string): Promise<ChannelView> {
  const channel = await channelBySlug(slug)
  if (actor.id !== null && !isAtDesk(actor, channel.id)) throw notFound('This desk')
  return channelView(permit(actor, 'channel.desk', channel))
}
