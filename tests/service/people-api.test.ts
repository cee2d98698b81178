import { beforeAll, describe, expect, it } from 'vitest'
import { DELETE as takeOff, PATCH as changeRole } from '@/app/api/channels/[channel]/people/[person]/route'
import { GET as people, POST as invite } from '@/app/api/channels/[channel]/people/route'
import { GET as me } from '@/app/api/me/route'
import { DELETE as endToken } from '@/app/api/me/tokens/[id]/route'
import { POST as makeToken } from '@/app/api/me/tokens/route'
import { actorOfHeaders } from '@/lib/auth/actor-of-request'
import { acceptInvitation, readInvitation } from '@/lib/people/invitations'
import type { Channel } from '@/models/channel'
import { Letter } from '@/models/letter'
import { Membership } from '@/models/membership'
import type { User } from '@/models/user'
import { makeChannel, makeMember, makeUser } from '../factories'
import { freshDatabase } from '../support/database'
import { call, cookieOf } from '../support/requests'

freshDatabase()

let channel: Channel
let owner: User
let editor: User

beforeAll(async () => {
  channel = await makeChannel()
  owner = await makeMember(channel, 'owner')
  editor = await makeMember(channel, 'editor')
})

const actorOf = async (user: User) => actorOfHeaders(new Headers({ cookie: await cookieOf(user.id) }))
const at = (person?: User) => ({ channel: channel.slug, ...(person ? { person: person.id } : {}) })

describe('people of a channel', () => {
  it('are shown with their addresses to owners alone', async () => {
    const status = async (as?: string) => (await call(people, '/x', { as, params: at() })).status
    expect([await status(), await status(editor.id), await status(owner.id)]).toEqual([401, 403, 200])
  })

  it('never lose their last owner, also when two step down at once', async () => {
    const own = await makeChannel()
    const [one, two] = [await makeMember(own, 'owner'), await makeMember(own, 'owner')]
    const demote = (user: User) =>
      call(changeRole, '/x', {
        method: 'PATCH',
        body: { role: 'editor' },
        as: user.id,
        params: { channel: own.slug, person: user.id },
      })
    const answers = await Promise.all([demote(one), demote(two)])
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 409])
    expect(await Membership.count({ where: { channelId: own.id, role: 'owner' } })).toBe(1)
  })

  it('are taken off by an owner and lose the desk with it', async () => {
    const leaving = await makeMember(channel, 'editor')
    const off = await call(takeOff, '/x', { method: 'DELETE', as: owner.id, params: at(leaving) })
    expect(off.status).toBe(204)
    expect(await actorOf(leaving)).toMatchObject({ memberships: [] })
  })
})

describe('an invitation', () => {
  it('is a letter whose link opens a place for that address alone, once', async () => {
    const guest = await makeUser()
    const asked = await call(invite, '/x', {
      body: { email: guest.email, role: 'adviser' },
      as: owner.id,
      params: at(),
    })
    expect(asked.status).toBe(201)
    const letter = await Letter.findOne({ where: { toAddress: guest.email } })
    const token = /\/join\/(\S+)/.exec(letter?.text ?? '')?.[1] ?? ''
    expect(await readInvitation(token)).toMatchObject({ role: 'adviser', channelName: channel.name })

    await expect(acceptInvitation(await actorOf(editor), token)).rejects.toMatchObject({ status: 403 })
    expect(await acceptInvitation(await actorOf(guest), token)).toBe(channel.slug)
    expect(await actorOf(guest)).toMatchObject({ memberships: [{ slug: channel.slug, role: 'adviser' }] })
    await expect(acceptInvitation(await actorOf(guest), token)).rejects.toMatchObject({ status: 404 })
  })
})

describe('a token for scripts', () => {
  it('signs its person in until it is ended, and only they can end it', async () => {
    const made = await call(makeToken, '/x', { body: { name: 'Weather feed' }, as: owner.id })
    const { id, token } = (await made.json()) as { id: string; token: string }
    const asScript = () => call(me, '/x', { headers: { authorization: `Bearer ${token}` } })
    expect(await (await asScript()).json()).toMatchObject({
      id: owner.id,
      channels: [{ slug: channel.slug, role: 'owner' }],
    })
    const end = (as: string) => call(endToken, '/x', { method: 'DELETE', as, params: { id } })
    expect((await end(editor.id)).status).toBe(404)
    expect((await end(owner.id)).status).toBe(204)
    expect((await asScript()).status).toBe(401)
  })
})
