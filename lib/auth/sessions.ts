import { Op } from 'sequelize'
import '@/models/associations'
import { Session } from '@/models/session'
import type { User } from '@/models/user'
import { now } from '@/lib/clock'

export const SESSION_SECONDS = 14 * 24 * 3600

/** Opens a sign-in that the server can end. Returns its id. */
export async function openSession(userId: string): Promise<string> {
  const expiresAt = new Date(now().getTime() + SESSION_SECONDS * 1000)
  return (await Session.create({ userId, expiresAt })).id
}

export async function isOpen(id: string): Promise<boolean> {
  const session = (await Session.findOne({
    where: { id, endedAt: null, expiresAt: { [Op.gt]: now() } },
    include: ['user'],
  })) as (Session & { user: User }) | null
  return session !== null && session.user.disabledAt === null
}

export const endSession = (id: string) => Session.update({ endedAt: now() }, { where: { id, endedAt: null } })

/** Ends every sign-in of a person, but the one they are using if it is named. */
export const endSessionsOf = (userId: string, but?: string) =>
  Session.update({ endedAt: now() }, { where: { userId, endedAt: null, ...(but ? { id: { [Op.ne]: but } } : {}) } })
