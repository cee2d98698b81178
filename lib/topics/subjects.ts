import type { Topic } from './rules'

const labels = {
  soil: 'Soil',
  water: 'Water',
  weather: 'Weather',
  seed: 'Seed',
  machinery: 'Machinery',
  pests: 'Pests',
  weeds: 'Weeds',
  disease: 'Disease',
  nutrients: 'Nutrients',
  storage: 'Storage',
  money: 'Money',
  safety: 'Safety',
}

/** Subjects, code `subject-…`: what a chapter is about when it is neither a stage nor a job. */
export const subjectTopics: Topic[] = Object.entries(labels).map(([name, label]) => ({
  code: `subject-${name}`,
  label,
  kind: 'subject',
  crop: null,
  bbch: null,
  stage: null,
}))
