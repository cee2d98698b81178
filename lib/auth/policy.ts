import { forbidden, notFound, signInNeeded } from '@/lib/errors'
import { type Actor, isAdviserSomewhere, isAtDesk, isOneOf, isPerson, type Person } from './actor'

type OfChannel = { channelId: string }
type Rule<T> = (who: Actor, it: T) => boolean

const anyone = () => true
const signedIn: Rule<unknown> = (who) => isPerson(who)
const admin: Rule<unknown> = (who) => isPerson(who) && who.isAdmin
const owner: Rule<OfChannel> = (who, it) => isOneOf(who, it.channelId, 'owner')
const maker: Rule<OfChannel> = (who, it) => isOneOf(who, it.channelId, 'owner', 'editor')
const desk: Rule<OfChannel> = (who, it) => isAtDesk(who, it.channelId)
const ofChannelId = (rule: Rule<OfChannel>) => (who: Actor, it: { id: string }) => rule(who, { channelId: it.id })

/** The whole law of the product, one line per action. A unit test prints it as a table. */
export const law = {
  'channel.see': anyone,
  'channel.desk': ofChannelId(desk),
  'channel.settings': ofChannelId(owner),
  'channel.people': ofChannelId(owner),
  'season.edit': maker,
  'episode.see': (who: Actor, it: OfChannel & { state: string }) => it.state === 'published' || desk(who, it),
  'episode.create': ofChannelId(maker),
  'episode.edit': maker,
  'episode.publish': maker,
  'episode.delete': owner,
  'footage.send': maker,
  'footage.see': desk,
  'captions.edit': maker,
  'question.see': (who: Actor, it: OfChannel & { state: string; askerId: string | null }) =>
    it.state !== 'set-aside' || desk(who, it) || (isPerson(who) && who.id === it.askerId),
  'question.ask': signedIn,
  'question.asking': signedIn,
  'question.sort': desk,
  'question.book': maker,
  'question.answer': maker,
  'question.history': desk,
  'question.verdict': (who: Actor, it: { askerIds: readonly string[] }) =>
    isPerson(who) && it.askerIds.includes(who.id),
  'handbook.write': (who: Actor) => isPerson(who) && (who.isAdmin || isAdviserSomewhere(who)),
  'claim.check': (who: Actor, it: { authorId: string | null }) =>
    isAdviserSomewhere(who) && isPerson(who) && it.authorId !== who.id,
  'self.edit': (who: Actor, it: { id: string }) => isPerson(who) && who.id === it.id,
  'site.admin': admin,
} satisfies Record<string, Rule<never>>

export type Action = keyof typeof law
export type Subject<A extends Action> =
  Parameters<(typeof law)[A]> extends [unknown, infer T, ...unknown[]] ? T : object

declare const proof: unique symbol
/** A row that `permit` has let through; writes accept nothing less. */
export type Permitted<A extends Action, T> = T & { readonly [proof]: A }

/** Whether somebody who may not do this may at least know that the thing is there. */
function maySee(actor: Actor, it: object): boolean {
  if ('state' in it && 'channelId' in it && 'askerId' in it) return law['question.see'](actor, it as never)
  if ('state' in it && 'channelId' in it && 'number' in it) return law['episode.see'](actor, it as never)
  return 'channelId' in it ? isAtDesk(actor, String(it.channelId)) : true
}

export const may = <A extends Action>(actor: Actor, action: A, it: Subject<A>): boolean =>
  (law[action] as Rule<unknown>)(actor, it)

/**
 * The only door: the row, proven.
 * @throws Problem 404 when there is no row or this actor may not know of it, 401 when signing in could help, 403 otherwise
 */
export function permit<A extends Action, T extends Subject<A> & object>(
  actor: Actor,
  action: A,
  it: T | null | undefined,
  what?: string,
): Permitted<A, T> {
  if (!it) throw notFound(what)
  if (may(actor, action, it)) return it as Permitted<A, T>
  if (!maySee(actor, it)) throw notFound(what)
  if (!isPerson(actor)) throw signInNeeded()
  throw forbidden()
}

/** The person behind this request. @throws Problem 401 */
export function requirePerson(actor: Actor): Person {
  if (!isPerson(actor)) throw signInNeeded()
  return actor
}
