import type { Role } from '@/lib/auth/actor'

export const roleWords: Record<Role, string> = {
  owner: 'Owner: everything, and people',
  editor: 'Editor: episodes and questions',
  adviser: 'Adviser: helps with answers, checks the handbook',
}

export const roleOptions = (Object.keys(roleWords) as Role[]).map((value) => ({ value, label: roleWords[value] }))
