import type { StoryEpisode } from './types'

// Figures: first node at least 1 cm above the tillering node (BBCH 31, Meier 2001). A circle of one square foot is
// 2·sqrt(144/π) = 13.5 in across; a square foot of 7.5 in rows is 144 / 7.5 = 19.2 in of row.
export const firstNode: StoryEpisode = {
  key: 'first-node',
  channel: 'alder-fork',
  number: 5,
  title: 'The first node, and two of your questions',
  slug: 'the-first-node-and-two-of-your-questions',
  summary:
    'How to find the first node with a knife and a rule, whether dead tillers count, and which hoop suits narrow rows.',
  season: '2026',
  filmedOn: '2026-04-09',
  publishedOn: '2026-04-12',
  state: 'published',
  chapters: [
    {
      title: 'Finding the first node',
      topics: ['wheat-31', 'wheat-30'],
      scene: 'first-node',
      lines: [
        { text: 'Pull the main stem and slit it from the bottom.' },
        {
          text: 'The first node counts | when it sits 1 centimetre above the tillering node.',
          key: 'node',
          reading: { quantity: 'first node above the tillering node', value: 1, unit: 'cm' },
        },
        { text: 'That is jointing, and the head is already below your thumb.' },
        { text: 'From here on wheels and hard frost both cost heads.', key: 'jointing-risk' },
      ],
    },
    {
      title: 'June asks about dead tillers',
      topics: ['wheat-29', 'wheat-2'],
      scene: 'tillers',
      lines: [
        { text: 'June asked whether dead tillers count if the crown is white.', by: 'tomasz', key: 'dead-tillers' },
        { text: 'Count the plant, because a white crown makes new tillers.' },
        { text: 'Do not count the tiller, because a brown one never makes a head.' },
        { text: 'So the hoop counts crowns in March, and stems in April.', key: 'dead-tillers-end' },
      ],
    },
    {
      title: 'Which hoop for narrow rows',
      topics: ['wheat-2', 'job-drilling'],
      scene: 'two-hoops',
      lines: [
        { text: 'Osei asked which hoop to use in narrow rows.', by: 'tomasz', key: 'hoop-size' },
        {
          text: 'One square foot is a ring 13 and a half inches across, | whatever the rows are.',
          voiced: 'One square foot is a ring thirteen and a half inches across, | whatever the rows are.',
          key: 'ring',
          reading: { quantity: 'hoop of one square foot', value: 13.5, unit: 'in', note: 'inside diameter' },
        },
        { text: 'Or lay a stick along the row.' },
        {
          text: 'In seven and a half inch rows, 19.2 inches of row are a square foot.',
          voiced: 'In seven and a half inch rows, nineteen point two inches of row are a square foot.',
          key: 'hoop-size-end',
          reading: { quantity: 'row length in a square foot', value: 19.2, unit: 'in', note: '7.5 in rows' },
        },
      ],
    },
  ],
}
