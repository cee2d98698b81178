import type { Transaction } from 'sequelize'
import { hashPassword } from '@/lib/auth/passwords'
import { Channel } from '@/models/channel'
import { Membership } from '@/models/membership'
import { User } from '@/models/user'
import { channels } from './story/channels'
import { demoPassword, people } from './story/people'

/** Ids by the keys of the story. */
export type Ids = Map<string, string>

export function idOf(ids: Ids, key: string): string {
  const id = ids.get(key)
  if (!id) throw new Error(`the story names ${key}, who is nobody`)
  return id
}

export async function seedChannels(transaction: Transaction): Promise<Ids> {
  const ids: Ids = new Map()
  for (const { slug, name, blurb, timeZone } of channels) {
    ids.set(slug, (await Channel.create({ slug, name, blurb, timeZone }, { transaction })).id)
  }
  return ids
}

/** The people; only those who are listed as sign-ins get a password. */
export async function seedPeople(channelIds: Ids, transaction: Transaction): Promise<Ids> {
  const ids: Ids = new Map()
  for (const { key, name, email, isAdmin = false, member, signsIn } of people) {
    const passwordHash = signsIn ? await hashPassword(demoPassword) : null
    const emailVerified = new Date('2026-01-05T09:00:00Z')
    const user = await User.create({ name, email, isAdmin, passwordHash, emailVerified }, { transaction })
    ids.set(key, user.id)
    if (!member) continue
    const channelId = idOf(channelIds, member.channel)
    await Membership.create({ channelId, userId: user.id, role: member.role }, { transaction })
  }
  return ids
}
