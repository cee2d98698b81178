import type { Crop } from './crops'
import { jobTopics } from './field-jobs'
import { stageWord, type StageKey } from './stage-words'
import { stageTopics } from './stages'
import { subjectTopics } from './subjects'

export type { Crop } from './crops'
export type { StageKey } from './stage-words'
export { crops, cropWord } from './crops'
export { stageKeys, stageWord } from './stage-words'

/**
 * What a chapter is filed under. Codes: `wheat-21` (crop and BBCH), `wheat-2` (principal stage), `soil` (before
 * sowing), `job-tillage`, `subject-water`. `stage` chooses pattern, colour and word; jobs and subjects have none.
 */
export type Topic = {
  code: string
  label: string
  kind: 'stage' | 'job' | 'subject'
  crop: Crop | null
  bbch: string | null
  stage: StageKey | null
  hazardous?: true
}

/** The whole vocabulary: stages crop by crop, then jobs, then subjects. */
export const topics: Topic[] = [...stageTopics, ...jobTopics, ...subjectTopics]

const byCode = new Map(topics.map((topic) => [topic.code, topic]))

/** Null for a code that the published key does not list (rice-31, maize-22 …): such codes are refused, never guessed. */
export function topicByCode(code: string): Topic | null {
  return byCode.get(code) ?? null
}

/** Whether something filed under `code` is found by a filter on `filter`: `wheat-2` finds `wheat-21`, not the reverse. */
export function topicMatches(filter: string, code: string): boolean {
  if (filter === code) return true
  const wanted = topicByCode(filter)
  const filed = topicByCode(code)
  if (!wanted?.crop || wanted.bbch?.length !== 1) return false
  return filed?.crop === wanted.crop && filed.stage === wanted.stage
}

/** The stage that a chapter is drawn in: the first of its topics that is one. */
export function stageOf(codes: string[]): StageKey | null {
  for (const code of codes) {
    const stage = topicByCode(code)?.stage
    if (stage) return stage
  }
  return null
}

const searchable = topics.map((topic) => ({
  topic,
  words: `${topic.label} ${topic.code} ${topic.bbch ?? ''} ${topic.stage ? stageWord(topic.stage, topic.crop) : ''}`
    .toLowerCase()
    .split(/[^\p{L}\p{N}%]+/u),
}))

/**
 * The topics that a person typing means: every typed word begins a word of the topic. A number is read as a code
 * first ("wheat 2" opens with wheat's stage 2) and as a count after that (two leaves). Nothing typed gives what a list
 * can show at a glance: principal stages, jobs and subjects.
 */
export function findTopics(typed: string): Topic[] {
  const sought = typed.toLowerCase().match(/[\p{L}\p{N}%]+/gu) ?? []
  if (sought.length === 0) return topics.filter((topic) => topic.bbch?.length !== 2)
  const found = searchable
    .filter(({ words }) => sought.every((start) => words.some((word) => word.startsWith(start))))
    .map(({ topic }) => topic)
  const byNumber = (topic: Topic) => sought.some((start) => /^\d/.test(start) && topic.bbch?.startsWith(start))
  return [...found.filter(byNumber), ...found.filter((topic) => !byNumber(topic))]
}
