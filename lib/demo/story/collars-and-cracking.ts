import type { StoryEpisode } from './types'

// Figures: 80/55 °F give 17.5 and 90/65 °F give 25.5 heat units (Purdue's modified 86/50 method); emergence takes about
// 115, each collar to the tenth 82, so 785 is (785 - 115) / 82 = 8.2 collars.
export const collarsAndCracking: StoryEpisode = {
  key: 'collars-and-cracking',
  channel: 'alder-fork',
  number: 6,
  title: 'Count collars, not tips',
  slug: 'count-collars-not-tips',
  summary:
    'Corn is staged by its collars and timed by its heat. Nell counts one plant, works one warm day, and finds the beans cracking next door.',
  season: '2026',
  filmedOn: '2026-05-20',
  publishedOn: '2026-05-23',
  state: 'published',
  chapters: [
    {
      title: 'Three collars',
      topics: ['maize-13', 'maize-1'],
      scene: 'collars',
      lines: [
        { text: 'Start at the short rounded leaf, because it counts.', key: 'round-leaf' },
        { text: 'Follow each blade down to its collar, | the pale band where it meets the sheath.' },
        {
          text: 'One, two, three.',
          key: 'three-collars',
          reading: { quantity: 'collars showing', value: 3, unit: 'leaves' },
        },
        { text: 'The two in the whorl have no collar yet, so they wait.' },
      ],
    },
    {
      title: 'One warm day in heat units',
      topics: ['maize-1', 'subject-weather'],
      scene: 'heat-day',
      lines: [
        { text: 'Yesterday ran from 55 up to 80 degrees.' },
        {
          text: 'Add them, halve them, take off 50: that day was 17.5 heat units.',
          voiced: 'Add them, halve them, take off fifty: that day was seventeen point five heat units.',
          key: 'warm-day',
          reading: {
            quantity: 'heat units of one day',
            value: 17.5,
            unit: '°F days',
            note: '80 and 55 °F, base 50, cap 86',
          },
        },
        {
          text: 'On a day of 90 and 65, count the 90 as 86, and you get 25.5.',
          voiced:
            'On a day of ninety and sixty five, count the ninety as eighty six, and you get twenty five point five.',
          by: 'imani',
          key: 'hot-day',
          reading: {
            quantity: 'heat units of one day',
            value: 25.5,
            unit: '°F days',
            note: '90 counted as 86, and 65 °F',
          },
        },
        { text: 'The crop does not grow faster than that, so neither does the count.' },
      ],
    },
    {
      title: 'From seed to the eighth collar',
      topics: ['maize-18', 'subject-weather'],
      scene: 'heat-steps',
      lines: [
        {
          text: 'Coming up takes about 115 growing degree days.',
          voiced: 'Coming up takes about one hundred fifteen growing degree days.',
          key: 'corn-emergence',
          reading: { quantity: 'heat units to emergence', value: 115, unit: '°F days', note: '100 to 120' },
        },
        {
          text: 'Each collar after that takes about 82.',
          voiced: 'Each collar after that takes about eighty two.',
          key: 'per-collar',
          reading: { quantity: 'heat units per collar', value: 82, unit: '°F days', note: 'to the tenth leaf' },
        },
        {
          text: 'So at 785 you should find eight collars.',
          voiced: 'So at seven hundred eighty five you should find eight collars.',
          key: 'eight-collars',
        },
        { text: 'If you find fewer, go and look at the roots.' },
      ],
    },
    {
      title: 'Beans cracking the crust',
      topics: ['soybean-09', 'soybean-10'],
      scene: 'bean-cracking',
      lines: [
        { text: 'Next door the soybeans are cracking.', key: 'cracking' },
        { text: 'The stem pulls the seed leaves up bent double, | so a hard crust breaks necks.' },
        { text: 'Two days later the cotyledons are open and the stand can be counted.', key: 'bean-stand' },
      ],
    },
  ],
}
