import type { Role } from '@/lib/auth/actor'

/** A person as the site admin sees them. */
export type SitePersonView = {
  id: string
  name: string
  email: string
  isAdmin: boolean
  disabled: boolean
  since: string
  channels: { slug: string; name: string; role: Role }[]
}
