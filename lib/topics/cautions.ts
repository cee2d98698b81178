import type { JobName } from './field-jobs'

/**
 * How far a citation was followed: `V` the rule's text or an official page quoting it was opened, `V2` as someone else
 * transcribed it, `M` from memory. What is M is shown as "from memory" until somebody opens the source.
 */
export type CitationStatus = 'V' | 'V2' | 'M'

export type Caution = {
  key: string
  title: string
  text: string
  citation: string
  status: CitationStatus
  jobs: JobName[]
}

/** Stands under every caution. */
export const whoComesFirst = 'Your label, your manual, local rules and licensed people come first.'

export const cautions: Caution[] = [
  {
    key: 'rops',
    title: 'Roll-over frame and belt',
    text: 'Wear the belt on a tractor with a roll-over frame: the belt is what keeps you inside the frame.',
    citation: '29 CFR 1928.51',
    status: 'V',
    jobs: ['machine-setup', 'haulage'],
  },
  {
    key: 'guards',
    title: 'Guards, and motion stopped',
    text: 'Keep the guards on. Engine off and every part still before you clear or reach in. Teach it again each year.',
    citation: '29 CFR 1928.57(a)(6)',
    status: 'V',
    jobs: ['harvest', 'machine-setup', 'repair'],
  },
  {
    key: 'pto',
    title: 'PTO shafts',
    text: 'Guard the shaft, both couplings and the stub. Never step over a shaft that turns.',
    citation: '29 CFR 1928.57(b)(1), (c)(2)(ii)',
    status: 'V',
    jobs: ['machine-setup', 'repair', 'drying'],
  },
  {
    key: 'riders',
    title: 'Riders and children',
    text: 'One seat, one person, unless somebody is being taught or helps to run the machine.',
    citation: '29 CFR 1928.57(a)(6)(ii)',
    status: 'V',
    jobs: ['harvest', 'haulage'],
  },
  {
    key: 'lock-out',
    title: 'Shut down and lock out',
    text: 'Shut down, take the key, lock out electric power and block what is raised. Then work.',
    citation: '29 CFR 1928.57(a)(6)(v); 29 CFR 1910.147 as practice',
    status: 'M',
    jobs: ['repair', 'grain-bin', 'drying'],
  },
  {
    key: 'hot-work',
    title: 'Sparks and straw',
    text: 'Clear chaff, straw and fuel for 35 feet, keep an extinguisher by you and somebody watching for half an hour after.',
    citation: '29 CFR 1910.252(a)(2); NFPA 51B (newer editions ask a longer watch)',
    status: 'M',
    jobs: ['welding'],
  },
  {
    key: 'tanks',
    title: 'Used tanks and drums',
    text: 'Never weld or cut a container that held fuel or chemicals before it is cleaned and vented.',
    citation: '29 CFR 1910.252(a)(3)',
    status: 'M',
    jobs: ['welding'],
  },
  {
    key: 'grain-bin',
    title: 'Inside a grain bin',
    text: 'Lock out the augers, test the air, wear harness and lifeline, keep somebody outside, and never walk down grain.',
    citation: '29 CFR 1910.272(g); exempt family farms do well to follow the same steps',
    status: 'V',
    jobs: ['grain-bin', 'drying'],
  },
  {
    key: 'road',
    title: 'On the road',
    text: 'Show the slow-moving-vehicle emblem and lights, and keep to 25 mph or less. State law governs.',
    citation: 'ANSI/ASABE S276 and S279',
    status: 'M',
    jobs: ['haulage'],
  },
  {
    key: 'overhead-lines',
    title: 'Overhead lines',
    text: 'Fold, look up and keep 10 feet away. If you touch a line, stay in the cab and call for help.',
    citation: '29 CFR 1910.333(c)',
    status: 'M',
    jobs: ['haulage', 'harvest', 'spraying', 'grain-bin'],
  },
  {
    key: 'pesticides',
    title: 'Pesticides',
    text: 'The label is the law. Keep everybody out until the longest restricted-entry interval is over.',
    citation: 'FIFRA; 40 CFR 170.407',
    status: 'M',
    jobs: ['spraying', 'seed-treatment'],
  },
  {
    key: 'ammonia',
    title: 'Anhydrous ammonia',
    text: 'Goggles and gloves, 5 gallons of clean water on every nurse tank, stand upwind, bleed before you unhook.',
    citation: '29 CFR 1910.111',
    status: 'M',
    jobs: ['fertilising'],
  },
  {
    key: 'moving-water',
    title: 'Water over a levee',
    text: 'Treat moving water over a levee as deep and live. Do not drive in.',
    citation: 'NOAA National Weather Service flood guidance',
    status: 'M',
    jobs: ['levees'],
  },
]

/** The cautions that a set of topic codes calls for, each once, in the order of the list above. */
export function cautionsFor(codes: string[]): Caution[] {
  const filed = new Set(codes)
  return cautions.filter((caution) => caution.jobs.some((job) => filed.has(`job-${job}`)))
}
