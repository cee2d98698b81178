import { describe, expect, it } from 'vitest'
import { type Actor, nobody, type Role } from '@/lib/auth/actor'
import { type Action, law, may, permit } from '@/lib/auth/policy'
import { Problem } from '@/lib/errors'

const person = (id: string, belongs: { channelId: string; role: Role }[] = [], isAdmin = false): Actor => ({
  id,
  name: id,
  isAdmin,
  units: 'us',
  language: 'en',
  sessionId: null,
  memberships: belongs.map((one) => ({ ...one, slug: 'farm', channelName: 'Farm' })),
})

const who: Record<string, Actor> = {
  nobody,
  viewer: person('viewer'),
  adviser: person('adviser', [{ channelId: 'own', role: 'adviser' }]),
  editor: person('editor', [{ channelId: 'own', role: 'editor' }]),
  owner: person('owner', [{ channelId: 'own', role: 'owner' }]),
  'other owner': person('other', [{ channelId: 'other', role: 'owner' }]),
  admin: person('admin', [], true),
}

/** A thing of the channel `own` that fits every rule: a draft, asked by the viewer and written by the adviser. */
const it_ = {
  id: 'own',
  channelId: 'own',
  state: 'set-aside',
  askerId: 'viewer',
  askerIds: ['viewer'],
  authorId: 'adviser',
}

const table = Object.keys(law).map((action) => {
  const row = Object.entries(who)
    .map(([name, actor]) => (may(actor, action as Action, it_ as never) ? name : ''))
    .filter(Boolean)
  return `${action}: ${row.length === Object.keys(who).length ? 'everybody' : row.join(', ') || 'nobody at all'}`
})

describe('the law', () => {
  it('reads as this table, over something private of one channel', () => {
    expect(table).toMatchInlineSnapshot(`
      [
        "channel.see: everybody",
        "channel.desk: adviser, editor, owner",
        "channel.settings: owner",
        "channel.people: owner",
        "season.edit: editor, owner",
        "episode.see: adviser, editor, owner",
        "episode.create: editor, owner",
        "episode.edit: editor, owner",
        "episode.publish: editor, owner",
        "episode.delete: owner",
        "footage.send: editor, owner",
        "footage.see: adviser, editor, owner",
        "captions.edit: editor, owner",
        "question.see: viewer, adviser, editor, owner",
        "question.ask: viewer, adviser, editor, owner, other owner, admin",
        "question.asking: viewer, adviser, editor, owner, other owner, admin",
        "question.sort: adviser, editor, owner",
        "question.book: editor, owner",
        "question.answer: editor, owner",
        "question.history: adviser, editor, owner",
        "question.verdict: viewer",
        "handbook.write: adviser, admin",
        "claim.check: nobody at all",
        "self.edit: nobody at all",
        "site.admin: admin",
      ]
    `)
  })

  it('tells nobody to sign in, and a stranger that there is nothing', () => {
    const refusal = (actor: Actor, row: object | null) => {
      try {
        permit(actor, 'episode.edit', row as never)
      } catch (failure) {
        return (failure as Problem).status
      }
    }
    const published = { channelId: 'own', number: 1, state: 'published' }
    const draft = { channelId: 'own', number: 1, state: 'draft' }
    const of = (name: string) => who[name] as Actor
    expect([refusal(of('nobody'), published), refusal(of('nobody'), draft)]).toEqual([401, 404])
    expect([refusal(of('viewer'), published), refusal(of('viewer'), draft)]).toEqual([403, 404])
    expect([refusal(of('adviser'), draft), refusal(of('other owner'), draft)]).toEqual([403, 404])
    expect([refusal(of('editor'), draft), refusal(of('editor'), null)]).toEqual([undefined, 404])
  })
})
