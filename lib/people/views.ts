import type { Person } from '@/lib/auth/actor'

/** The person, as GET /api/me tells them. */
export const meView = ({ id, name, isAdmin, units, language, memberships }: Person) => ({
  id,
  name,
  isAdmin,
  units,
  language,
  channels: memberships.map(({ slug, channelName, role }) => ({ slug, name: channelName, role, units, language })),
})
