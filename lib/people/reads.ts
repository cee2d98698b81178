import '@/models/associations'
import { Op } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit, requirePerson } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { now } from '@/lib/clock'
import { ApiToken } from '@/models/api-token'
import { Invitation } from '@/models/invitation'
import { Membership } from '@/models/membership'
import type { User } from '@/models/user'
import type { InvitationView, MemberView, TokenView } from './views'

export type PeopleOfChannel = { members: MemberView[]; invitations: InvitationView[] }

/** Who belongs to a channel and who was asked to. For its owners. @throws Problem 403, 404 */
export async function readPeople(actor: Actor, slug: string): Promise<PeopleOfChannel> {
  const channel = permit(actor, 'channel.people', await channelBySlug(slug))
  const members = (await Membership.findAll({
    where: { channelId: channel.id },
    include: ['user'],
    order: [['createdAt', 'asc']],
  })) as (Membership & { user: User })[]
  const invitations = await Invitation.findAll({
    where: { channelId: channel.id, acceptedAt: null, expiresAt: { [Op.gt]: now() } },
    order: [['createdAt', 'asc']],
  })
  return {
    members: members.map(({ role, createdAt, user: { id, name, email } }) => ({
      id,
      name,
      email,
      role,
      since: createdAt.toISOString(),
    })),
    invitations: invitations.map(({ id, email, role, expiresAt }) => ({
      id,
      email,
      role,
      expires: expiresAt.toISOString(),
    })),
  }
}

/** The tokens that a person's scripts use; never the tokens themselves. */
export async function readTokens(actor: Actor): Promise<TokenView[]> {
  const rows = await ApiToken.findAll({
    where: { userId: requirePerson(actor).id, endedAt: null },
    order: [['createdAt', 'desc']],
  })
  return rows.map(({ id, name, createdAt, lastUsedAt }) => ({
    id,
    name,
    made: createdAt.toISOString(),
    lastUsed: lastUsedAt?.toISOString() ?? null,
  }))
}
