import { describe, expect, it } from 'vitest'
import { actorOfHeaders } from '@/lib/auth/actor-of-request'
import { may } from '@/lib/auth/policy'
import { endSessionsOf } from '@/lib/auth/sessions'
import { Membership } from '@/models/membership'
import { makeChannel, makeMember } from '../factories'
import { freshDatabase } from '../support/database'
import { cookieOf } from '../support/requests'

freshDatabase()

const actorWith = async (cookie: string) => actorOfHeaders(new Headers({ cookie }))

describe('a signed-in person', () => {
  it('is who the database says at this request, with the roles of this request', async () => {
    const channel = await makeChannel()
    const owner = await makeMember(channel, 'owner')
    const cookie = await cookieOf(owner.id)
    expect(may(await actorWith(cookie), 'episode.create', channel)).toBe(true)

    await Membership.update({ role: 'adviser' }, { where: { userId: owner.id } })
    expect(may(await actorWith(cookie), 'episode.create', channel)).toBe(false)
  })

  it('is nobody at once when disabled', async () => {
    const channel = await makeChannel()
    const owner = await makeMember(channel, 'owner')
    const cookie = await cookieOf(owner.id)
    await owner.update({ disabledAt: new Date() })
    expect((await actorWith(cookie)).id).toBeNull()
  })

  it('is nobody when the cookie is replayed after signing out', async () => {
    const owner = await makeMember(await makeChannel(), 'owner')
    const cookie = await cookieOf(owner.id)
    expect((await actorWith(cookie)).id).toBe(owner.id)
    await endSessionsOf(owner.id)
    expect((await actorWith(cookie)).id).toBeNull()
  })

  it('is nobody with a forged cookie', async () => {
    expect((await actorWith('next-auth.session-token=eyJhbGciOiJub25lIn0..x.y.z')).id).toBeNull()
  })
})
