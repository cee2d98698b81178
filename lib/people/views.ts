import type { Person, Role } from '@/lib/auth/actor'

/** The person, as GET /api/me tells them. */
export const meView = ({ id, name, isAdmin, units, language, memberships }: Person) => ({
  id,
  name,
  isAdmin,
  units,
  language,
  channels: memberships.map(({ slug, channelName, role }) => ({ slug, name: channelName, role, units, language })),
})

/** Somebody of a channel; addresses are for its owners alone. */
export type MemberView = { id: string; name: string; email: string; role: Role; since: string }
export type InvitationView = { id: string; email: string; role: Role; expires: string }
export type TokenView = { id: string; name: string; made: string; lastUsed: string | null }
