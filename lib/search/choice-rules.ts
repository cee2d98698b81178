import { type Crop, crops, cropWord } from '@/lib/topics/crops'
import { topicByCode, topics } from '@/lib/topics/rules'
import { stageWord } from '@/lib/topics/stage-words'
import type { SearchQuery, SearchResult } from './schema'

export type Choice = { value: string; label: string }
export type ChoiceGroup = { label: string; options: Choice[] }
type Facets = SearchResult['facets']

/** "Wheat (12)"; without counts, as when the search is down, just "Wheat". */
const counted = (label: string, count: number | undefined) => (count === undefined ? label : `${label} (${count})`)

/** Values with a count, and the one that is chosen even when nothing has it. Without counts: all there could be. */
function offered(all: readonly string[], counts: Record<string, number> | null, chosen: string | undefined): string[] {
  return counts ? all.filter((value) => counts[value] !== undefined || value === chosen) : [...all]
}

export function cropChoices(facets: Facets | null, chosen?: string): Choice[] {
  const counts = facets?.crop ?? null
  return offered(crops, counts, chosen).map((value) => ({
    value,
    label: counted(cropWord(value as Crop), counts?.[value]),
  }))
}

const ofKind = (kind: 'job' | 'subject') => topics.filter((topic) => topic.kind === kind).map(({ code }) => code)

export function topicChoices(kind: 'job' | 'subject', facets: Facets | null, chosen?: string): Choice[] {
  const counts = facets?.[kind] ?? null
  return offered(ofKind(kind), counts, chosen).map((value) => ({
    value,
    label: counted(topicByCode(value)?.label ?? value, counts?.[value]),
  }))
}

/** Without the crop's name, which heads the group; a two-digit stage with its code, as growers say it. */
function stageLabel(code: string): string {
  const topic = topicByCode(code)
  if (!topic?.stage) return code
  if (topic.bbch?.length !== 2) return stageWord(topic.stage, topic.crop)
  return `${topic.bbch} ${topic.label.replace(/^[^:]+: /, '')}`
}

/** The seedbed, then principal stages crop by crop; the two-digit ones as well once one crop is chosen. */
export function stageChoices(
  facets: Facets | null,
  query: Pick<SearchQuery, 'crop' | 'stage'>,
): (Choice | ChoiceGroup)[] {
  const counts = facets?.stage ?? null
  const stages = topics.filter(({ kind, crop, bbch }) => {
    if (kind !== 'stage' || (query.crop && crop && crop !== query.crop)) return false
    return bbch?.length !== 2 || crop === query.crop
  })
  const codes = offered([...new Set([...stages.map(({ code }) => code), query.stage ?? 'soil'])], counts, query.stage)
  const choice = (value: string): Choice => ({ value, label: counted(stageLabel(value), counts?.[value]) })
  const groups = crops.map((crop) => ({
    label: cropWord(crop),
    options: codes.filter((code) => topicByCode(code)?.crop === crop).map(choice),
  }))
  const loose = codes.filter((code) => !topicByCode(code)?.crop).map(choice)
  return [...loose, ...groups.filter(({ options }) => options.length > 0)]
}

/** Years or channels: only what is counted, newest or first by name. */
export function plainChoices(
  counts: Record<string, number> | undefined,
  chosen: string | undefined,
  label: (value: string) => string = (value) => value,
): Choice[] {
  const values = new Set([...Object.keys(counts ?? {}), ...(chosen ? [chosen] : [])])
  return [...values].map((value) => ({ value, label: counted(label(value), counts?.[value]) }))
}
