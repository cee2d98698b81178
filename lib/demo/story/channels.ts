import type { Speaker } from './types'

type StoryChannel = { slug: string; name: string; about: string; timeZone: string; language: string; owner: Speaker }

export const channels: StoryChannel[] = [
  {
    slug: 'alder-fork',
    name: 'Alder Fork Farm',
    about:
      'Winter wheat, soybean and maize on river-bottom silt loam. Nell films the work as it happens, Tomasz cuts it, and Imani checks the figures.',
    timeZone: 'America/Chicago',
    language: 'en',
    owner: 'nell',
  },
  {
    slug: 'terrace-nine',
    name: 'Terrace Nine',
    about:
      'A cooperative of paddy-rice growers on a hillside: nine terraces, one stream, and water handed down from bank to bank.',
    timeZone: 'America/Los_Angeles',
    language: 'en',
    owner: 'sunniva',
  },
]
