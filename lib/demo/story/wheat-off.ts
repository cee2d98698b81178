import type { StoryEpisode } from './types'

// Figures: drying 20 % to 15 % wet basis shrinks 5 · 100 / 85 = 5.88 %; wheat weighs 60 lb a bushel, its usual standard
// moisture is 13.5 %. Cautions on bins: 29 CFR 1910.272(g).
export const wheatOff: StoryEpisode = {
  key: 'wheat-off',
  channel: 'alder-fork',
  number: 7,
  title: 'Wheat off, beans in flower',
  slug: 'wheat-off-beans-in-flower',
  summary:
    'Hard kernels under a thumbnail, why five points of water are not five percent, and the first open flowers in the River Piece.',
  season: '2026',
  filmedOn: '2026-07-02',
  publishedOn: '2026-07-05',
  state: 'published',
  chapters: [
    {
      title: 'Hard under a thumbnail',
      topics: ['wheat-89', 'job-harvest'],
      scene: 'combine',
      lines: [
        { text: 'The kernel is hard, and a thumbnail leaves no mark.', key: 'hard-kernel' },
        { text: 'Go too late and it will shatter in front of the combine.' },
        {
          text: 'Nobody stands near the header, | and it is off and still before anyone clears it.',
          key: 'header-caution',
        },
        {
          text: 'The first load came in at 20 percent, so we stopped for dinner.',
          key: 'wet-load',
          reading: { quantity: 'grain moisture, wet basis', value: 20, unit: '%', note: 'first load' },
        },
      ],
    },
    {
      title: 'Five points are not five percent',
      topics: ['wheat-99', 'job-grain-bin'],
      scene: 'grain-flow',
      lines: [
        { text: 'Dry from 20 down to 15, and you do not lose 5 percent.' },
        {
          text: 'Divide by what is not water, and the shrink is 5.88 percent.',
          voiced: 'Divide by what is not water, and the shrink is five point eight eight percent.',
          key: 'shrink',
          reading: { quantity: 'water shrink', value: 5.88, unit: '%', note: '20 % to 15 %, wet basis' },
        },
        { text: 'And never step into a bin on moving grain.', by: 'imani', key: 'bin-caution' },
        {
          text: 'Lock out the auger, test the air, | wear the harness and line, and keep someone outside.',
          by: 'imani',
          key: 'bin-steps',
        },
      ],
    },
    {
      title: 'Beans in flower',
      topics: ['soybean-61', 'soybean-6'],
      scene: 'bean-flower',
      lines: [
        { text: 'In the River Piece about one soybean flower in ten is open.', key: 'first-flower' },
        { text: 'They open low on the stem first, and you have to part the leaves.' },
        { text: 'Write the day down, because every later stage is reckoned from it.' },
      ],
    },
  ],
}
