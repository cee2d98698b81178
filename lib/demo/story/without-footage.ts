import type { StoryEpisode } from './types'

/** Two that have no film: one still being prepared at the desk, one taken down again. */
export const withoutFootage: StoryEpisode[] = [
  {
    key: 'autumn-pass',
    channel: 'alder-fork',
    number: 3,
    title: 'An autumn pass, and what it costs',
    slug: 'an-autumn-pass-and-what-it-costs',
    summary: 'Withdrawn: the fuel figure was for another tool. It will be filmed again.',
    season: '2025',
    filmedOn: '2025-11-12',
    publishedOn: '2025-11-15',
    state: 'withdrawn',
    chapters: [],
  },
  {
    key: 'bin-day',
    channel: 'alder-fork',
    number: 8,
    title: 'Bin day, before the fan goes on',
    slug: 'bin-day-before-the-fan-goes-on',
    summary: 'What is looked over before grain goes into store.',
    season: '2026',
    filmedOn: '2026-11-24',
    publishedOn: null,
    state: 'draft',
    chapters: [],
  },
]
