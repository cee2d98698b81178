import type { StoryEpisode } from './types'

// Figures: soak 24-36 h and drain 24-36 h; 15-20 plants wanted from 30 seeds per square foot.
export const levelAndFlooded: StoryEpisode = {
  key: 'level-and-flooded',
  channel: 'terrace-nine',
  number: 1,
  title: 'Level, puddled, flooded',
  slug: 'level-puddled-flooded',
  summary:
    'The stream comes in at the top terrace. Sunniva levels by water, sets a gate, soaks seed for a day and a half, and waits for the first spikes.',
  season: '2026',
  filmedOn: '2026-04-28',
  publishedOn: '2026-05-02',
  state: 'published',
  chapters: [
    {
      title: 'Water finds the high spots',
      topics: ['soil', 'job-levelling'],
      scene: 'terraces',
      lines: [
        { text: 'Nine terraces, one stream, and the water shows us every high spot.' },
        { text: 'We puddle the soil so that it seals and holds the flood.', key: 'puddle' },
        { text: 'Where mud stands dry, we drag it into the hollow.' },
      ],
    },
    {
      title: 'Setting the gate',
      topics: ['job-levees', 'job-irrigation', 'subject-water'],
      scene: 'levee-gate',
      lines: [
        { text: 'Each levee has one gate, and the board sets the height of the water.', key: 'gate' },
        {
          text: 'We hold 5 centimetres for young rice.',
          key: 'depth',
          reading: { quantity: 'water held on the terrace', value: 5, unit: 'cm', note: 'as measured at the gate' },
        },
        {
          text: 'Water running over a levee is deeper and faster than it looks, | so keep out of it.',
          key: 'levee-caution',
        },
      ],
    },
    {
      title: 'A day and a half in the sack',
      topics: ['rice-03', 'rice-05'],
      scene: 'seed-soak',
      lines: [
        {
          text: 'Soak the seed 24 to 36 hours, then drain it for as long again.',
          key: 'soak',
          reading: { quantity: 'soaking time', value: 36, unit: 'h', note: '24 to 36' },
        },
        { text: 'When white root tips just show, it is pre-germinated.', key: 'pregerminated' },
        { text: 'Any longer, and the roots knit the sack together.' },
      ],
    },
    {
      title: 'Spikes above the water',
      topics: ['rice-10', 'rice-12'],
      scene: 'rice-spike',
      lines: [
        { text: 'Nine days on, the leaves stand above the water.' },
        {
          text: 'We sowed 30 seeds on a square foot, and I count 17 plants.',
          key: 'rice-stand',
          reading: { quantity: 'rice plants', value: 17, unit: 'per square foot', note: '15 to 20 wanted' },
        },
        { text: 'Fifteen to twenty is what we want, so this stand stays.' },
      ],
    },
  ],
}
