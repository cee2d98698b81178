import { Op } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { cutPage, decodeCursor, type Page } from '@/lib/http/paging'
import '@/models/associations'
import type { Channel } from '@/models/channel'
import type { Membership } from '@/models/membership'
import { User } from '@/models/user'
import type { PeopleQuery } from './schema'
import type { SitePersonView } from './views'

type Loaded = User & { memberships: (Membership & { channel: Channel })[] }

const view = (user: Loaded): SitePersonView => ({
  id: user.id,
  name: user.name,
  email: user.email,
  isAdmin: user.isAdmin,
  disabled: user.disabledAt !== null,
  since: user.createdAt.toISOString(),
  channels: user.memberships.map(({ role, channel }) => ({ slug: channel.slug, name: channel.name, role })),
})

/** `%` and `_` are letters here, not wildcards. */
const containing = (text: string) => `%${text.replace(/[\\%_]/g, '\\$&')}%`

/** Everybody with a way to sign in, by address. For the site admin. @throws Problem 401, 403 */
export async function listPeople(actor: Actor, { q, cursor, limit }: PeopleQuery): Promise<Page<SitePersonView>> {
  permit(actor, 'site.admin', {})
  const after = cursor ? String(decodeCursor(cursor, 1)[0]) : ''
  const named = q
    ? { [Op.or]: [{ email: { [Op.iLike]: containing(q) } }, { name: { [Op.iLike]: containing(q) } }] }
    : {}
  const rows = (await User.findAll({
    where: { [Op.and]: [{ email: { [Op.gt]: after } }, named] },
    include: [{ association: 'memberships', include: ['channel'], separate: true }],
    order: [['email', 'asc']],
    limit: limit + 1,
  })) as Loaded[]
  return cutPage(rows, limit, view, ({ email }) => [email])
}
