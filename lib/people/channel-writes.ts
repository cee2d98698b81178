import { Op, type Transaction } from 'sequelize'
import type { Actor, Role } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { inTransaction } from '@/lib/db'
import { conflict, notFound } from '@/lib/errors'
import { Channel } from '@/models/channel'
import { Membership } from '@/models/membership'

/** A channel is never left without an owner. */
async function refuseOwnerless(channelId: string, personId: string, transaction: Transaction): Promise<void> {
  const others = await Membership.count({
    where: { channelId, role: 'owner', userId: { [Op.ne]: personId } },
    transaction,
  })
  if (others === 0) throw conflict('A channel keeps at least one owner. Make somebody else owner first.')
}

/** Somebody of the channel, which is locked so that two owners cannot step down at once. */
async function refuseStranger(channelId: string, personId: string, transaction: Transaction): Promise<void> {
  await Channel.findByPk(channelId, { transaction, lock: true })
  const count = await Membership.count({ where: { channelId, userId: personId }, transaction })
  if (count === 0) throw notFound('This person')
}

/** @throws Problem 409 when the channel would have no owner left */
export async function changeRole(actor: Actor, slug: string, personId: string, role: Role): Promise<void> {
  const channel = permit(actor, 'channel.people', await channelBySlug(slug))
  await inTransaction(async (transaction) => {
    await refuseStranger(channel.id, personId, transaction)
    if (role !== 'owner') await refuseOwnerless(channel.id, personId, transaction)
    await Membership.update({ role }, { where: { channelId: channel.id, userId: personId }, transaction })
  })
}

/** @throws Problem 409 when the channel would have no owner left */
export async function removeMember(actor: Actor, slug: string, personId: string): Promise<void> {
  const channel = permit(actor, 'channel.people', await channelBySlug(slug))
  await inTransaction(async (transaction) => {
    await refuseStranger(channel.id, personId, transaction)
    await refuseOwnerless(channel.id, personId, transaction)
    await Membership.destroy({ where: { channelId: channel.id, userId: personId }, transaction })
  })
}
