import { randomBytes } from 'node:crypto'
import type { Actor } from '@/lib/auth/actor'
import { hashToken } from '@/lib/auth/actor-of-request'
import { requirePerson } from '@/lib/auth/policy'
import { endSessionsOf } from '@/lib/auth/sessions'
import { now } from '@/lib/clock'
import { conflict, notFound } from '@/lib/errors'
import { ApiToken } from '@/models/api-token'
import { User } from '@/models/user'
import type { SelfPatch } from './schema'

const MOST_TOKENS = 20

export async function editSelf(actor: Actor, patch: SelfPatch): Promise<void> {
  await User.update(patch, { where: { id: requirePerson(actor).id } })
}

/** Makes a token for scripts. It is told this once; only its hash is kept. @throws Problem 409 past twenty */
export async function makeToken(actor: Actor, name: string): Promise<{ id: string; name: string; token: string }> {
  const { id: userId } = requirePerson(actor)
  if ((await ApiToken.count({ where: { userId, endedAt: null } })) >= MOST_TOKENS)
    throw conflict(`At most ${MOST_TOKENS} tokens. End one first.`)
  const token = `row_${randomBytes(32).toString('base64url')}`
  const { id } = await ApiToken.create({ userId, name, tokenHash: hashToken(token) })
  return { id, name, token }
}

/** @throws Problem 404 when it is not theirs */
export async function endToken(actor: Actor, id: string): Promise<void> {
  const [ended] = await ApiToken.update(
    { endedAt: now() },
    { where: { id, userId: requirePerson(actor).id, endedAt: null } },
  )
  if (ended === 0) throw notFound('This token')
}

/** Ends every sign-in but the one in use. */
export async function endOtherSessions(actor: Actor): Promise<void> {
  const person = requirePerson(actor)
  await endSessionsOf(person.id, person.sessionId ?? undefined)
}
