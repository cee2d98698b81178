import type { StoryEpisode } from './types'

// Figures: rice BBCH 30 green ring, 32 panicle 1-2 mm, 45 late boot, 55 half headed, 65 full flower (Meier 2001);
// DD50 with caps 94/70 gives 32 for 95/75 °F, its daily ceiling, and 29 for 88/70.
export const greenRing: StoryEpisode = {
  key: 'green-ring',
  channel: 'terrace-nine',
  number: 2,
  title: 'From green ring to full flower',
  slug: 'from-green-ring-to-full-flower',
  summary:
    'A stem split for the green ring, why a hot day stops counting at 32, a tube that shows the water below ground, and the panicle coming out.',
  season: '2026',
  filmedOn: '2026-07-28',
  publishedOn: '2026-08-01',
  state: 'published',
  chapters: [
    {
      title: 'The green ring',
      topics: ['rice-30', 'rice-32'],
      scene: 'green-ring',
      lines: [
        { text: 'Split a main stem, and look for a thin green ring above the roots.' },
        { text: 'That is panicle initiation, and the head has begun.', key: 'initiation' },
        {
          text: 'A week on, the panicle is 2 millimetres long.',
          key: 'panicle-length',
          reading: { quantity: 'panicle length', value: 2, unit: 'mm' },
        },
        { text: 'From now until flowering the rice must not want for water.', key: 'no-dry' },
      ],
    },
    {
      title: 'A hot day stops at thirty-two',
      topics: ['rice-3', 'subject-weather'],
      scene: 'rice-heat',
      lines: [
        { text: 'We reckon rice by degree days above 50.' },
        {
          text: 'A day of 88 and 70 counts 29.',
          key: 'rice-day',
          reading: { quantity: 'heat units of one day', value: 29, unit: '°F days', note: '88 and 70 °F, base 50' },
        },
        {
          text: 'A day of 95 and 75 counts 32, and no day ever counts more.',
          key: 'rice-ceiling',
          reading: { quantity: 'heat units of one day', value: 32, unit: '°F days', note: '95 and 75 °F, the ceiling' },
        },
      ],
    },
    {
      title: 'Reading the tube',
      topics: ['rice-45', 'job-irrigation'],
      scene: 'water-tube',
      lines: [
        { text: 'Pilar asked how we know when to let water back in.', key: 'tube' },
        { text: 'A tube with holes, sunk in the mud, shows the level below ground.' },
        { text: 'Earlier we let it dry and flood again. Now, in boot, the flood stays on.', key: 'tube-end' },
      ],
    },
    {
      title: 'Heading and flowering',
      topics: ['rice-55', 'rice-65'],
      scene: 'panicle',
      lines: [
        { text: 'Here the panicle is half out of the sheath, | which is the middle of heading.', key: 'heading' },
        { text: 'Anthers hang at the tip first, and flowering runs down from there.' },
        { text: 'Walk on the levee, and leave the crop alone at midday.' },
      ],
    },
  ],
}
