import type { Topic } from './rules'

const labels = {
  tillage: 'Tillage',
  levelling: 'Levelling and land forming',
  drainage: 'Drainage',
  drilling: 'Drilling',
  planting: 'Planting',
  transplanting: 'Transplanting',
  'cover-crops': 'Cover crops and residue',
  weeding: 'Weeding by machine or hand',
  scouting: 'Scouting',
  'soil-sampling': 'Soil sampling',
  irrigation: 'Irrigation',
  levees: 'Levees, checks and gates',
  spraying: 'Spraying',
  'seed-treatment': 'Seed treatment',
  fertilising: 'Fertilising and liming',
  harvest: 'Harvest',
  drying: 'Drying and storage',
  'grain-bin': 'Grain bin work',
  'machine-setup': 'Hitching, PTO and machine set-up',
  repair: 'Repair',
  welding: 'Welding and cutting',
  haulage: 'Haulage and road travel',
  records: 'Records and planning',
} as const

export type JobName = keyof typeof labels

/**
 * The jobs that carry a caution in cautions.ts: an episode filed under one cannot be published before it is confirmed.
 * Driving a tool over a field (tillage, drilling) is not among them: what hurts there is hitching, clearing and the PTO.
 */
export const hazardousJobs = [
  'levees',
  'spraying',
  'seed-treatment',
  'fertilising',
  'harvest',
  'drying',
  'grain-bin',
  'machine-setup',
  'repair',
  'welding',
  'haulage',
] as const satisfies JobName[]

const hazardous = new Set<string>(hazardousJobs)

/** Field jobs, code `job-…`. */
export const jobTopics: Topic[] = Object.entries(labels).map(([name, label]) => ({
  code: `job-${name}`,
  label,
  kind: 'job',
  crop: null,
  bbch: null,
  stage: null,
  ...(hazardous.has(name) ? { hazardous: true as const } : {}),
}))
