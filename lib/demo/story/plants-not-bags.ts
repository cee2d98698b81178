import type { StoryEpisode } from './types'

// Figures: 30 plants/ft2, TKW 38 g, survival 0.94 (97 % germination less 3 % loss) give 121 lb/ac by the rule of ten
// and 116.5 exactly, because the exact divisor is 10.413. Wheat emerges at about 270 °F heat units.
export const plantsNotBags: StoryEpisode = {
  key: 'plants-not-bags',
  channel: 'alder-fork',
  number: 2,
  title: 'Drill by plants, not by bags',
  slug: 'drill-by-plants-not-by-bags',
  summary:
    'A thousand kernels on the scale, the sum with its true divisor, the drill in the ground, and the first green line.',
  season: '2025',
  filmedOn: '2025-10-06',
  publishedOn: '2025-10-17',
  state: 'published',
  chapters: [
    {
      title: 'Count out a thousand',
      topics: ['wheat-00', 'job-drilling'],
      scene: 'kernels',
      lines: [
        { text: 'Every seed lot is a different size, so count and weigh.' },
        {
          text: 'A thousand kernels of this lot weigh 38 grams.',
          key: 'tkw',
          reading: { quantity: 'thousand-kernel weight', value: 38, unit: 'g' },
        },
        {
          text: 'The tag says 97 percent germination, and I allow 3 for loss.',
          key: 'survival',
          reading: { quantity: 'expected survival', value: 94, unit: '%', note: '97 % germination less 3 % loss' },
        },
        { text: 'That leaves 94, and I take it off once, not twice.' },
      ],
    },
    {
      title: 'The sum and its divisor',
      topics: ['wheat-00', 'job-drilling'],
      scene: 'sum-board',
      lines: [
        {
          text: 'I want 30 plants on each square foot.',
          key: 'plants-wanted',
          reading: { quantity: 'plants wanted', value: 30, unit: 'per square foot' },
        },
        {
          text: 'Thirty times 38, over point 94, over ten, is 121 pounds an acre.',
          voiced:
            'Thirty times thirty eight, over point ninety four, over ten, is one hundred twenty one pounds an acre.',
          key: 'rule-of-ten',
          reading: { quantity: 'seeding rate, rule of ten', value: 121, unit: 'lb/ac' },
        },
        {
          text: 'The exact divisor is 10.413, Nell.',
          voiced: 'The exact divisor is ten point four one three, Nell.',
          by: 'imani',
          key: 'divisor',
        },
        {
          text: 'Then it is 116 and a half, and the rule of ten is 4 percent heavy.',
          key: 'exact-rate',
          reading: { quantity: 'seeding rate, exact', value: 116.5, unit: 'lb/ac' },
        },
      ],
    },
    {
      title: 'The drill goes in',
      topics: ['wheat-00', 'job-drilling'],
      scene: 'drill',
      lines: [
        { text: 'I start at the headland, stop, and dig behind the drill.' },
        { text: 'Seed wants moist soil under it and a closed slot over it.' },
        {
          text: 'If a tube blocks, everything stops | and the key is in my pocket before I look.',
          key: 'drill-caution',
        },
        { text: 'Then one long pull, and turn round at the end.' },
      ],
    },
    {
      title: 'The first green line',
      topics: ['wheat-09', 'wheat-10'],
      scene: 'emergence',
      lines: [
        { text: 'Ten days on, and the coleoptile has cut through.', key: 'coleoptile' },
        { text: 'Emergence is about the warmth it has had, not the calendar.' },
        {
          text: 'Half the plants show at about 270 growing degree days, on a base of 32.',
          voiced: 'Half the plants show at about two hundred seventy growing degree days, on a base of thirty two.',
          key: 'wheat-emergence',
          reading: { quantity: 'heat units to half emergence', value: 270, unit: '°F days', note: 'base 32 °F' },
        },
      ],
    },
  ],
}
