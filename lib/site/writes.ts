import { Op } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit, requirePerson } from '@/lib/auth/policy'
import { endSessionsOf } from '@/lib/auth/sessions'
import { type ChannelView, channelView } from '@/lib/channels/views'
import { now } from '@/lib/clock'
import { inTransaction } from '@/lib/db'
import { conflict, notFound } from '@/lib/errors'
import { freeSlug, slugOf } from '@/lib/episodes/rules'
import { inviteTo } from '@/lib/people/invitations'
import { Channel } from '@/models/channel'
import { User } from '@/models/user'
import type { ChannelInput, PersonPatch } from './schema'

/** Opens a channel and asks its owner in by letter. @throws Problem 401, 403 */
export async function createChannel(actor: Actor, { owner, ...plain }: ChannelInput): Promise<ChannelView> {
  permit(actor, 'site.admin', {})
  return inTransaction(async (transaction) => {
    const wanted = slugOf(plain.name)
    const alike = await Channel.findAll({
      where: { slug: { [Op.startsWith]: wanted } },
      attributes: ['slug'],
      transaction,
    })
    const slug = freeSlug(wanted, new Set(alike.map((row) => row.slug)))
    const channel = await Channel.create({ ...plain, slug }, { transaction })
    await inviteTo(channel, requirePerson(actor), { email: owner, role: 'owner' }, transaction)
    return channelView(channel)
  })
}

/**
 * Disables or lets in again, makes a site admin or not. Whoever is disabled is out at once: their sign-ins end too.
 * @throws Problem 404, 409 for oneself: an installation must not lose its last admin by a slip
 */
export async function editPerson(actor: Actor, id: string, { disabled, isAdmin }: PersonPatch): Promise<void> {
  permit(actor, 'site.admin', {})
  if (actor.id === id) throw conflict('Another site admin has to do this for you.')
  await inTransaction(async (transaction) => {
    const user = await User.findByPk(id, { transaction, lock: true })
    if (!user) throw notFound('This person')
    await user.update(
      {
        ...(disabled === undefined ? {} : { disabledAt: disabled ? (user.disabledAt ?? now()) : null }),
        ...(isAdmin === undefined ? {} : { isAdmin }),
      },
      { transaction },
    )
    if (disabled) await endSessionsOf(id)
  })
}

/** Makes somebody site admin by address, opening their account where there is none; they sign in by mail. For the script alone. */
export async function makeSiteAdmin(email: string): Promise<void> {
  const address = email.trim().toLowerCase()
  const [user] = await User.findOrCreate({
    where: { email: address },
    defaults: { email: address, name: 'Site admin' },
  })
  await user.update({ isAdmin: true, disabledAt: null })
}
