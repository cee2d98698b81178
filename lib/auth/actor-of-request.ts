import { createHash } from 'node:crypto'
import { getToken } from 'next-auth/jwt'
import type { NextApiRequest } from 'next'
import '@/models/associations'
import { ApiToken } from '@/models/api-token'
import { Session } from '@/models/session'
import type { User } from '@/models/user'
import type { Membership } from '@/models/membership'
import type { Channel } from '@/models/channel'
import { env } from '@/lib/env'
import { now } from '@/lib/clock'
import { type Actor, nobody, type Person } from './actor'

type LoadedUser = User & { memberships: (Membership & { channel: Channel })[] }

const WITH_MEMBERSHIPS = { association: 'user', include: [{ association: 'memberships', include: ['channel'] }] }

export const hashToken = (token: string) => createHash('sha256').update(token).digest('hex')

function personOf(user: LoadedUser, sessionId: string | null): Person {
  return {
    id: user.id,
    name: user.name,
    isAdmin: user.isAdmin,
    units: user.units,
    language: user.language,
    sessionId,
    memberships: user.memberships.map(({ channelId, role, channel }) => ({
      channelId,
      role,
      slug: channel.slug,
      channelName: channel.name,
    })),
  }
}

async function bySession(id: string): Promise<Actor> {
  const session = (await Session.findByPk(id, { include: [WITH_MEMBERSHIPS] })) as
    (Session & { user: LoadedUser }) | null
  if (!session || session.endedAt || session.expiresAt <= now() || session.user.disabledAt) return nobody
  return personOf(session.user, session.id)
}

async function byToken(token: string): Promise<Actor> {
  const found = (await ApiToken.findOne({
    where: { tokenHash: hashToken(token), endedAt: null },
    include: [WITH_MEMBERSHIPS],
  })) as (ApiToken & { user: LoadedUser }) | null
  if (!found || found.user.disabledAt) return nobody
  await ApiToken.update({ lastUsedAt: now() }, { where: { id: found.id } })
  return personOf(found.user, null)
}

/** Cookies or a bearer token in; the person as the database knows them now, or nobody. */
export async function actorOfHeaders(headers: Headers): Promise<Actor> {
  const bearer = /^Bearer\s+(\S+)$/i.exec(headers.get('authorization') ?? '')?.[1]
  if (bearer) return byToken(bearer)
  const cookies = cookiesOf(headers.get('cookie') ?? '')
  const secureCookie = env().BASE_URL.startsWith('https:')
  const claims = await getToken({
    req: { cookies, headers: {} } as unknown as NextApiRequest,
    secret: env().NEXTAUTH_SECRET,
    secureCookie,
  })
  return typeof claims?.sid === 'string' ? bySession(claims.sid) : nobody
}

export const actorOf = (request: Request): Promise<Actor> => actorOfHeaders(request.headers)

function cookiesOf(header: string): Record<string, string> {
  const pairs = header.split(';').map((pair) => pair.trim().split(/=(.*)/s))
  return Object.fromEntries(pairs.filter(([name]) => name).map(([name, value = '']) => [name, decode(value)]))
}

function decode(value: string): string {
  try {
    return decodeURIComponent(value)
  } catch {
    return value
  }
}
