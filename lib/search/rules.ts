import { topicByCode } from '@/lib/topics/rules'
import { stageKeys } from '@/lib/topics/stage-words'

/** What the search puts around found words. Private-use characters: no text of ours keeps any (see `plainText`). */
export const MARK_OPEN = '\ue000'
export const MARK_CLOSE = '\ue001'

/** A typed query as it is searched for: one line, composed accents, no controls, nothing that could pass for a mark. */
export function normalised(typed: string): string {
  return plainText(typed).slice(0, 200).trim()
}

/** A text as it goes into the index: one line, without controls, marks or lone surrogates. */
export function plainText(text: string): string {
  return text
    .normalize('NFC')
    .replace(/[\p{Cc}\p{Co}\p{Cs}\s]+/gu, ' ')
    .trim()
}

/** Words as they are compared: without case and accents. */
export function foldedWords(text: string): string[] {
  const plain = text.normalize('NFKD').replace(/\p{M}+/gu, '')
  return Array.from(plain.toLowerCase().matchAll(/[\p{L}\p{N}]+/gu), ([word]) => word)
}

/** A value inside a filter expression: quoted, so that no value is ever an operator. */
export const quoted = (value: string) => `"${value.replace(/["\\]/g, '\\$&')}"`

export type Narrowing = {
  kind?: string
  channel?: string
  crop?: string
  stage?: string
  job?: string
  subject?: string
  season?: string
}

const attributes: Record<keyof Narrowing, string> = {
  kind: 'kind',
  channel: 'channel',
  crop: 'crops',
  stage: 'stages',
  job: 'jobs',
  subject: 'subjects',
  season: 'season',
}

/** The names under which the index counts, by the names in our API. */
export const facetAttributes = attributes

const isBareStage = (value: string) => value !== 'soil' && (stageKeys as readonly string[]).includes(value)

/** The conditions that all hold, as the index reads them. A bare principal stage is looked for over all crops. */
export function conditionsOf(narrowing: Narrowing, except?: keyof Narrowing): string[] {
  return (Object.keys(attributes) as (keyof Narrowing)[]).flatMap((name) => {
    const value = narrowing[name]
    if (value === undefined || name === except) return []
    const attribute = name === 'stage' && isBareStage(value) ? 'stageKeys' : attributes[name]
    return [`${attribute} = ${quoted(value)}`]
  })
}

export type Filing = { crops: string[]; stages: string[]; stageKeys: string[]; jobs: string[]; subjects: string[] }

/** The topics of something as the index keeps them. A two-digit stage is also kept under its principal one. */
export function filing(codes: readonly string[]): Filing {
  const topics = codes.flatMap((code) => topicByCode(code) ?? [])
  const of = (kind: string) => topics.filter((topic) => topic.kind === kind)
  const stages = of('stage').flatMap(({ code, crop, stage }) => (crop ? [code, `${crop}-${stage}`] : [code]))
  return {
    crops: distinct(topics.flatMap(({ crop }) => crop ?? [])),
    stages: distinct(stages),
    stageKeys: distinct(topics.flatMap(({ stage }) => stage ?? [])),
    jobs: distinct(of('job').map(({ code }) => code)),
    subjects: distinct(of('subject').map(({ code }) => code)),
  }
}

const distinct = <T>(values: readonly T[]): T[] => [...new Set(values)]

/** Pairs of neighbouring letters, the ends of the word counted as letters: two swapped letters leave the ends alike. */
function pairs(word: string): string[] {
  const ended = `^${word}$`
  return Array.from({ length: ended.length - 1 }, (_, at) => ended.slice(at, at + 2))
}

/** How alike two words look, 0 to 1: shared pairs of letters over all pairs (Dice 1945). */
export function likeness(left: string, right: string): number {
  const [a, b] = [pairs(left), pairs(right)]
  const pool = [...b]
  const shared = a.filter((pair) => {
    const at = pool.indexOf(pair)
    if (at >= 0) pool.splice(at, 1)
    return at >= 0
  })
  return (2 * shared.length) / (a.length + b.length)
}

/** Below this two words do not look alike to a reader. Common practice, no source. */
const ALIKE = 0.5

/** The names nearest to any word of a query, nearest first. */
export function nearestNames<T extends { names: readonly string[] }>(
  query: string,
  known: readonly T[],
  most: number,
): T[] {
  const sought = foldedWords(query)
  const score = ({ names }: T) =>
    Math.max(0, ...names.flatMap(foldedWords).flatMap((word) => sought.map((each) => likeness(each, word))))
  return known
    .map((each) => ({ each, score: score(each) }))
    .filter((scored) => scored.score >= ALIKE)
    .sort((left, right) => right.score - left.score)
    .slice(0, most)
    .map(({ each }) => each)
}
