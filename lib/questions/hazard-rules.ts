import { type Caution, cautionsFor } from '@/lib/topics/cautions'
import type { JobName } from '@/lib/topics/field-jobs'

/**
 * Words by which a question shows that its work can hurt somebody, each with the job whose cautions then stand at its
 * head. Ours, and generous on purpose: a caution too many costs a line, one too few may cost a hand.
 */
const tellingWords: [RegExp, JobName][] = [
  [/\bweld(s|ed|er|ing)?\b|\bbraz(e|ing)\b|\bcutting torch\b/i, 'welding'],
  [/\b(grain )?bins?\b|\bsilos?\b/i, 'grain-bin'],
  [/\bdryers?\b|\bdrying bin\b/i, 'drying'],
  [/\bspray(s|ed|er|ing)?\b|\b(herb|pest|fung|insect)icides?\b|\bglyphosate\b|\bchemicals?\b/i, 'spraying'],
  [/\btreated seed\b|\bseed (treatment|dressing)\b/i, 'seed-treatment'],
  [/\banhydrous\b|\bammonia\b|\bnurse tanks?\b/i, 'fertilising'],
  [/\bpto\b|\bdriveshafts?\b|\bhitch(es|ed|ing)?\b/i, 'machine-setup'],
  [/\belectric(al|ity)?\b|\bwiring\b|\bvolts?\b|\bfuse ?box\b/i, 'repair'],
  [/\b(overhead|power) lines?\b/i, 'haulage'],
]

/**
 * The cautions that belong at the head of a question and its answer.
 * @param topics codes of the chapters it was asked and answered in
 */
export function cautionsOf(question: { title: string; body: string }, topics: readonly string[]): Caution[] {
  const words = `${question.title} ${question.body}`
  const told = tellingWords.filter(([pattern]) => pattern.test(words)).map(([, job]) => `job-${job}`)
  return cautionsFor([...topics, ...told])
}
