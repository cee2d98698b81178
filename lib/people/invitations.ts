import { randomBytes } from 'node:crypto'
import { Op, type Transaction } from 'sequelize'
import type { Actor, Role } from '@/lib/auth/actor'
import { hashToken } from '@/lib/auth/actor-of-request'
import { permit, requirePerson } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { now } from '@/lib/clock'
import { inTransaction } from '@/lib/db'
import { env } from '@/lib/env'
import { forbidden, notFound } from '@/lib/errors'
import { post } from '@/lib/mail/outbox'
import { Channel } from '@/models/channel'
import { Invitation } from '@/models/invitation'
import { Membership } from '@/models/membership'
import { User } from '@/models/user'
import type { InvitationInput } from './schema'

const DAYS_OPEN = 14

type Inviter = { id: string; name: string }

/** The same for a caller who has already been let through. */
export async function inviteTo(
  channel: Channel,
  { id: invitedBy, name }: Inviter,
  { email, role }: InvitationInput,
  transaction: Transaction,
): Promise<void> {
  const token = randomBytes(32).toString('base64url')
  await Invitation.destroy({ where: { channelId: channel.id, email, acceptedAt: null }, transaction })
  const expiresAt = new Date(now().getTime() + DAYS_OPEN * 86_400_000)
  const row = await Invitation.create(
    { channelId: channel.id, email, role, tokenHash: hashToken(token), invitedBy, expiresAt },
    { transaction },
  )
  const text = [
    `${name} asks you to work at the desk of ${channel.name} as ${role}.`,
    `To accept, within ${DAYS_OPEN} days:\n${env().BASE_URL}/join/${token}`,
  ].join('\n\n')
  const subject = `${channel.name} asks you to its desk`
  await post({ key: `invitation:${row.id}`, to: { address: email }, subject, text }, { transaction })
}

/** Asks somebody into a channel by letter. A second invitation replaces the first. @throws Problem 403, 404 */
export async function invite(actor: Actor, slug: string, invitation: InvitationInput): Promise<void> {
  const channel = permit(actor, 'channel.people', await channelBySlug(slug))
  await inTransaction((transaction) => inviteTo(channel, requirePerson(actor), invitation, transaction))
}

const openInvitation = (token: string, transaction?: Transaction) =>
  Invitation.findOne({
    where: { tokenHash: hashToken(token), acceptedAt: null, expiresAt: { [Op.gt]: now() } },
    transaction,
    lock: transaction?.LOCK.UPDATE,
  })

export type Offered = { channelName: string; role: Role }

/** What an invitation offers; null when it is used, over or not ours. */
export async function readInvitation(token: string): Promise<Offered | null> {
  const row = await openInvitation(token)
  const channel = row && (await Channel.findByPk(row.channelId))
  return channel ? { channelName: channel.name, role: row.role } : null
}

/**
 * Takes the place that was kept. An invitation is for the person whose address it went to.
 * @returns the channel's slug @throws Problem 404 used or over, 403 for another person
 */
export async function acceptInvitation(actor: Actor, token: string): Promise<string> {
  const { id: userId } = requirePerson(actor)
  return inTransaction(async (transaction) => {
    const row = await openInvitation(token, transaction)
    if (!row) throw notFound('This invitation')
    const user = await User.findByPk(userId, { transaction })
    if (user?.email !== row.email) throw forbidden('This invitation went to another address. Sign in as that person.')
    const channel = await Channel.findByPk(row.channelId, { transaction, rejectOnEmpty: true })
    await Membership.upsert({ channelId: row.channelId, userId, role: row.role }, { transaction })
    await row.update({ acceptedAt: now() }, { transaction })
    return channel.slug
  })
}
