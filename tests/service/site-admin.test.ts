import { beforeAll, describe, expect, it } from 'vitest'
import { PATCH as edit } from '@/app/api/admin/people/[id]/route'
import { GET as people } from '@/app/api/admin/people/route'
import { POST as open } from '@/app/api/channels/route'
import { actorOfHeaders } from '@/lib/auth/actor-of-request'
import { personByPassword } from '@/lib/auth/sign-in'
import { hashPassword } from '@/lib/auth/passwords'
import { acceptInvitation } from '@/lib/people/invitations'
import { makeSiteAdmin } from '@/lib/site/writes'
import type { SitePersonView } from '@/lib/site/views'
import { Letter } from '@/models/letter'
import { User } from '@/models/user'
import { makeUser } from '../factories'
import { freshDatabase } from '../support/database'
import { call, cookieOf } from '../support/requests'

freshDatabase()

let admin: User
let viewer: User

beforeAll(async () => {
  admin = await makeUser({ isAdmin: true })
  viewer = await makeUser({ passwordHash: await hashPassword('a long enough password') })
})

const actorOf = async (user: User) => actorOfHeaders(new Headers({ cookie: await cookieOf(user.id) }))
const patch = (id: string, body: object, as: string) => call(edit, '/x', { method: 'PATCH', body, as, params: { id } })

describe('the site admin', () => {
  it('alone sees who there is', async () => {
    expect((await call(people, '/x')).status).toBe(401)
    expect((await call(people, '/x', { as: viewer.id })).status).toBe(403)
    const found = await call(people, `/x?q=${encodeURIComponent(viewer.email)}`, { as: admin.id })
    expect(((await found.json()) as { items: SitePersonView[] }).items.map(({ id }) => id)).toEqual([viewer.id])
    const wild = await call(people, '/x?q=%25', { as: admin.id })
    expect(((await wild.json()) as { items: SitePersonView[] }).items).toEqual([])
  })

  it('disables a person, who is out at once by every door, and lets them in again', async () => {
    const cookie = await cookieOf(viewer.id)
    const signedIn = async () => (await actorOfHeaders(new Headers({ cookie }))).id !== null
    expect(await signedIn()).toBe(true)
    expect((await patch(viewer.id, { disabled: true }, viewer.id)).status).toBe(403)
    expect((await patch(viewer.id, { disabled: true }, admin.id)).status).toBe(204)
    expect(await signedIn()).toBe(false)
    expect(await personByPassword(viewer.email, 'a long enough password')).toBeNull()
    expect((await patch(viewer.id, { disabled: false }, admin.id)).status).toBe(204)
    expect(await personByPassword(viewer.email, 'a long enough password')).toMatchObject({ id: viewer.id })
    // The old sign-in was ended for good.
    expect(await signedIn()).toBe(false)
  })

  it('cannot shut themselves out', async () => {
    expect((await patch(admin.id, { isAdmin: false }, admin.id)).status).toBe(409)
  })

  it('opens a channel whose owner takes it by letter', async () => {
    const owner = await makeUser()
    const body = { name: 'Thistle Bank', owner: owner.email, timeZone: 'Europe/Dublin' }
    expect((await call(open, '/x', { body, as: viewer.id })).status).toBe(403)
    const made = await call(open, '/x', { body, as: admin.id })
    expect(await made.json()).toMatchObject({ slug: 'thistle-bank', timeZone: 'Europe/Dublin' })
    const letter = await Letter.findOne({ where: { toAddress: owner.email } })
    const token = /\/join\/(\S+)/.exec(letter?.text ?? '')?.[1] ?? ''
    expect(await acceptInvitation(await actorOf(owner), token)).toBe('thistle-bank')
    expect(await actorOf(owner)).toMatchObject({ memberships: [{ slug: 'thistle-bank', role: 'owner' }] })
    expect((await call(open, '/x', { body: { ...body, timeZone: 'Nowhere' }, as: admin.id })).status).toBe(400)
  })

  it('can be made by address where there is nobody yet', async () => {
    await makeSiteAdmin(' First@Farm.example ')
    expect(await User.findOne({ where: { email: 'first@farm.example' } })).toMatchObject({ isAdmin: true })
  })
})
