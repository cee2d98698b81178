import type { Actor } from '@/lib/auth/actor'

/** What the frame says of the person who is signed in. */
export type FramePerson = { name: string; isAdmin: boolean; desks: { slug: string; name: string }[] }

/** As much of the actor as the browser gets; null for somebody who is not signed in. */
export function framePerson(actor: Actor): FramePerson | null {
  if (actor.id === null) return null
  return {
    name: actor.name,
    isAdmin: actor.isAdmin,
    desks: actor.memberships.map(({ slug, channelName }) => ({ slug, name: channelName })),
  }
}

const titles = /^(dr|prof|mr|mrs|ms|sr|sra)\.?$/i

/** A name short enough for the bar: `Nell Okafor-Byrne` → `Nell O.`, titles left out, a single name as it is. */
export function shortName(name: string): string {
  const words = name.split(/\s+/).filter((word) => word && !titles.test(word))
  const [first, ...rest] = words
  const last = rest.at(-1)
  if (!first) return name
  return last ? `${first} ${Array.from(last)[0]}.` : first
}
