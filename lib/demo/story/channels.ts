import type { Speaker } from './types'

type StoryChannel = { slug: string; name: string; blurb: string; timeZone: string; owner: Speaker }

export const channels: StoryChannel[] = [
  {
    slug: 'alder-fork',
    name: 'Alder Fork Farm',
    blurb:
      'Winter wheat, soybean and maize on river-bottom silt loam. Nell films the work as it happens, Tomasz cuts it, and Imani checks the figures.',
    timeZone: 'America/Chicago',
    owner: 'nell',
  },
  {
    slug: 'terrace-nine',
    name: 'Terrace Nine',
    blurb:
      'A cooperative of paddy-rice growers on a hillside: nine terraces, one stream, and water handed down from bank to bank.',
    timeZone: 'America/Los_Angeles',
    owner: 'sunniva',
  },
]

/** Who speaks and owns; the story has no channel without one. */
export function ownerOf(slug: string): Speaker {
  const channel = channels.find((one) => one.slug === slug)
  if (!channel) throw new Error(`no channel is called ${slug}`)
  return channel.owner
}
