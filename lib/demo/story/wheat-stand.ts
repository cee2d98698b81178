import type { StoryEpisode } from './types'

// Figures: an acre is 43,560 square feet, so 19 plants per square foot are 827,640 plants per acre.
export const wheatStand: StoryEpisode = {
  key: 'wheat-stand',
  channel: 'alder-fork',
  number: 4,
  title: 'Is this wheat stand worth keeping?',
  slug: 'is-this-wheat-stand-worth-keeping',
  summary:
    'After three nights of hard frost: a thermometer at crown depth, a hoop thrown ten times, a crown split longways, and one sum.',
  season: '2026',
  filmedOn: '2026-03-18',
  publishedOn: '2026-03-21',
  state: 'published',
  chapters: [
    {
      title: 'Why we count now',
      topics: ['wheat-21', 'subject-weather'],
      scene: 'frost-field',
      lines: [
        { text: 'Three nights of hard frost on wheat that was barely tillering.', key: 'frost' },
        {
          text: 'The soil at crown depth was 31 degrees Fahrenheit at seven.',
          key: 'crown-depth',
          reading: { quantity: 'soil at crown depth', value: 31, unit: '°F', note: '7 a.m.' },
        },
        { text: 'Brown leaf tips look worse than they are.' },
        { text: 'Count before you worry.' },
      ],
    },
    {
      title: 'Throwing the hoop',
      topics: ['wheat-21', 'wheat-22'],
      scene: 'hoop',
      lines: [
        {
          text: 'Walk in well past the headland, | toss the hoop over your shoulder, | and count where it lands.',
          key: 'hoop',
        },
        {
          text: 'Nineteen plants in this one.',
          key: 'nineteen',
          reading: { quantity: 'plants in a hoop', value: 19, unit: 'per square foot', note: 'a one square foot hoop' },
        },
        { text: 'A plant is one crown, not one stem.', key: 'one-crown' },
        { text: 'Do ten of these on a zigzag, and keep the bad ones in.' },
        { text: 'One bare patch is a wet spot. | Bare patches in every throw are a stand problem.' },
      ],
    },
    {
      title: 'Splitting a crown',
      topics: ['wheat-22', 'subject-weather'],
      scene: 'crown',
      lines: [
        { text: 'Dig three plants and slice each crown longways.' },
        { text: 'White and firm is alive.', key: 'white-crown' },
        { text: 'Brown and soft is not coming back.' },
        { text: 'Cut away from your hand, with the crown on a board.' },
      ],
    },
    {
      title: 'What nineteen comes to',
      topics: ['wheat-2', 'subject-soil'],
      scene: 'zigzag',
      lines: [
        {
          text: 'An acre is 43,560 square feet.',
          voiced: 'An acre is forty three thousand, five hundred sixty square feet.',
        },
        {
          text: 'Nineteen to the foot is 827,640 plants on an acre.',
          voiced: 'Nineteen to the foot is eight hundred twenty seven thousand, six hundred forty plants on an acre.',
          key: 'per-acre',
          reading: { quantity: 'plants', value: 827640, unit: 'per acre', note: '19 × 43,560' },
        },
        { text: 'We set out for 30, so a third of it is gone, and the rest is even.', by: 'tomasz', key: 'a-third' },
        { text: 'We keep it, and look again at the first node.' },
      ],
    },
  ],
}
