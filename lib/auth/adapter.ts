import type { Adapter, AdapterUser } from 'next-auth/adapters'
import { QueryTypes } from 'sequelize'
import { db } from '@/lib/db'
import { now } from '@/lib/clock'
import { User } from '@/models/user'
import { VerificationToken } from '@/models/verification-token'

const asAdapterUser = (user: User): AdapterUser => ({
  id: user.id,
  email: user.email,
  name: user.name,
  emailVerified: user.emailVerified,
})

/** What somebody is called until they say so: the part before the @, which the account page lets them change. */
const nameFrom = (email: string) =>
  email
    .split('@')[0]
    ?.replace(/[._-]+/g, ' ')
    .trim() || 'Viewer'

/**
 * next-auth's doors to our tables, for sign-in by mail.
 * Written by hand because the published one drops every link of an address when anybody sends a wrong token.
 */
export const adapter = {
  async createUser({ email }: Omit<AdapterUser, 'id'>) {
    return asAdapterUser(await User.create({ email: email.toLowerCase(), name: nameFrom(email), emailVerified: now() }))
  },
  async getUser(id: string) {
    const user = await User.findByPk(id)
    return user && asAdapterUser(user)
  },
  async getUserByEmail(email: string) {
    const user = await User.findOne({ where: { email: email.toLowerCase() } })
    return user && asAdapterUser(user)
  },
  getUserByAccount: async () => null,
  async updateUser({ id }: Partial<AdapterUser> & Pick<AdapterUser, 'id'>) {
    await User.update({ emailVerified: now() }, { where: { id } })
    const user = await User.findByPk(id)
    if (!user) throw new Error('the person is gone')
    return asAdapterUser(user)
  },
  linkAccount: async () => undefined,
  createSession: async () => Promise.reject(new Error('sessions are opened in lib/auth/sessions')),
  getSessionAndUser: async () => null,
  updateSession: async () => null,
  deleteSession: async () => undefined,
  /** A newer link makes the older ones worthless. */
  async createVerificationToken({ identifier, token, expires }: { identifier: string; token: string; expires: Date }) {
    await VerificationToken.destroy({ where: { identifier } })
    await VerificationToken.create({ identifier, token, expiresAt: expires })
    return { identifier, token, expires }
  },
  /** Taken and deleted in one statement: of two clicks one wins. */
  async useVerificationToken({ identifier, token }: { identifier: string; token: string }) {
    const [taken] = await db().query<{ expires_at: Date }>(
      'delete from verification_tokens where identifier = $1 and token = $2 returning expires_at',
      { bind: [identifier, token], type: QueryTypes.SELECT },
    )
    return taken ? { identifier, token, expires: taken.expires_at } : null
  },
} satisfies Adapter
