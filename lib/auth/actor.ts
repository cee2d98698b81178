export type Role = 'owner' | 'editor' | 'adviser'
export type Units = 'us' | 'metric'
export type Belonging = { channelId: string; slug: string; channelName: string; role: Role }

/** Somebody who is not signed in. */
export type Nobody = { readonly id: null }

/** A signed-in person as the database knows them at this very request. */
export type Person = {
  readonly id: string
  readonly name: string
  readonly isAdmin: boolean
  readonly units: Units
  readonly language: string
  readonly memberships: readonly Belonging[]
  /** The sign-in this request rides on; null with a token. */
  readonly sessionId: string | null
}

export type Actor = Person | Nobody

export const nobody: Nobody = { id: null }

export const isPerson = (actor: Actor): actor is Person => actor.id !== null

export const isOneOf = (actor: Actor, channelId: string, ...roles: Role[]): boolean =>
  isPerson(actor) && actor.memberships.some((one) => one.channelId === channelId && roles.includes(one.role))

/** Owner, editor or adviser of the channel: those who see its desk. */
export const isAtDesk = (actor: Actor, channelId: string): boolean =>
  isOneOf(actor, channelId, 'owner', 'editor', 'adviser')

/** Channels whose private things this actor may see. */
export const deskChannelIds = (actor: Actor): string[] =>
  isPerson(actor) ? actor.memberships.map(({ channelId }) => channelId) : []

export const isAdviserSomewhere = (actor: Actor): boolean =>
  isPerson(actor) && actor.memberships.some(({ role }) => role === 'adviser')

/** The units this person reads in; nobody reads in US ones. */
export const unitsOf = (actor: Actor): Units => (isPerson(actor) ? actor.units : 'us')
