import type { StoryEpisode } from './types'

// Figures: plastic limit thread of 3 mm (ASTM D4318) and silt loam field capacity 30.5 % (Saxton & Rawls 2006),
// so 25 mm of rain on soil at 18 % wets 25 / (0.305 - 0.18) = 200 mm.
export const fitToWork: StoryEpisode = {
  key: 'fit-to-work',
  channel: 'alder-fork',
  number: 1,
  title: 'Fit to work, or only dry on top?',
  slug: 'fit-to-work-or-only-dry-on-top',
  summary:
    'Two days after an inch of rain the Long Field looks ready. Nell digs, rolls a thread of soil and decides whether the cultivator goes in before wheat.',
  season: '2025',
  filmedOn: '2025-09-22',
  publishedOn: '2025-09-26',
  state: 'published',
  chapters: [
    {
      title: 'Two days after the rain',
      topics: ['soil', 'subject-weather'],
      scene: 'field-after-rain',
      lines: [
        { text: 'This is the Long Field, two days after the rain.' },
        {
          text: 'The gauge had 25 millimetres, near enough one inch.',
          key: 'gauge',
          reading: { quantity: 'rain', value: 25, unit: 'mm', note: 'in the gauge, one storm' },
        },
        { text: 'From the road it looks dry, and the crust is pale.' },
        { text: 'A pale crust tells you about the top half inch and nothing else.' },
      ],
    },
    {
      title: 'How deep it went',
      topics: ['soil', 'subject-water'],
      scene: 'wetting-front',
      lines: [
        { text: 'So dig, and look for the wetting front.' },
        { text: 'Before the storm this silt loam held about 18 percent water.' },
        {
          text: 'At field capacity it holds about 30 and a half.',
          voiced: 'At field capacity it holds about thirty and a half.',
        },
        {
          text: 'Divide the rain by that gap, | and 25 millimetres reaches about 200 millimetres down.',
          key: 'front',
          reading: {
            quantity: 'depth of the wetting front',
            value: 200,
            unit: 'mm',
            note: '25 mm on silt loam from 18 % to 30.5 % water',
          },
        },
        { text: 'My spade says the same, give or take a finger.' },
      ],
    },
    {
      title: 'Roll a thread',
      topics: ['soil', 'subject-soil'],
      scene: 'thread',
      lines: [
        { text: 'Take a pinch from the depth you mean to work, | and roll it on a board.' },
        {
          text: 'A thread 3 millimetres thick | that just crumbles is at the plastic limit.',
          key: 'thread',
          reading: { quantity: 'thread of soil', value: 3, unit: 'mm', note: 'thickness at the plastic limit' },
        },
        { text: 'A long thread means it is wetter than that, so stay off.', key: 'stay-off' },
        { text: 'Mine falls apart at four inches, and still rolls at seven.' },
      ],
    },
    {
      title: 'One shallow pass',
      topics: ['soil', 'job-tillage'],
      scene: 'tillage-pass',
      lines: [
        { text: 'So we go shallow, one pass, and leave the wet layer alone.', key: 'shallow' },
        { text: 'Work it wet and you make clods that last until spring.' },
        {
          text: 'Nobody rides along, | and I stop the engine and take the key before I clear a sweep.',
          key: 'tillage-caution',
        },
        { text: 'What we want is a level seedbed | with crumbs on top and firm ground underneath.' },
      ],
    },
  ],
}
