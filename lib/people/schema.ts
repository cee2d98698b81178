import { z } from 'zod'
import { line } from '@/lib/episodes/schema'

export const role = z.enum(['owner', 'editor', 'adviser'])
export const address = z
  .string()
  .trim()
  .max(254)
  .transform((value) => value.toLowerCase())
  .pipe(z.email('an e-mail address'))

export const selfPatch = z
  .object({ name: line(80), units: z.enum(['us', 'metric']) })
  .partial()
  .strict()
export type SelfPatch = z.infer<typeof selfPatch>

export const tokenInput = z.object({ name: line(60) })
export const invitationInput = z.object({ email: address, role })
export type InvitationInput = z.infer<typeof invitationInput>
export const rolePatch = z.object({ role }).strict()
export const memberParams = z.object({ channel: z.string().min(1).max(80), person: z.uuid() })
