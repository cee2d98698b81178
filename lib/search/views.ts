import type { StageKey } from '@/lib/topics/stage-words'
import { stageOf, topicByCode, type Crop } from '@/lib/topics/rules'
import type { SearchDocument } from './document-rules'
import { spokenSnippet, withoutMarks } from './mark-rules'
import type { SearchItem } from './schema'

export type EpisodeRef = NonNullable<SearchItem['episode']>

/** What the database says now of something that was found: its title, and where a click leads. */
export type Place = {
  title: string
  /** The address, given the second that the words were found at. */
  url: (second: number) => string
  episode?: EpisodeRef
  /** Where the place is a range by itself, as the answer to a question is. */
  range?: { start: number; end: number }
  state?: string
}

/** A document as it was found: its texts carry marks around the found words. */
export type FoundDocument = Pick<
  SearchDocument,
  'id' | 'kind' | 'spoken' | 'starts' | 'text' | 'end' | 'stages' | 'crops'
>

/** The stage that a result is drawn in, and whose crop names it. */
function drawn({ stages, crops }: FoundDocument): { stage: StageKey | null; crop: Crop | null } {
  const first = stages.find((code) => topicByCode(code)?.stage)
  return {
    stage: stageOf(stages),
    crop: (first && topicByCode(first)?.crop) || topicByCode(`${crops[0]}-0`)?.crop || null,
  }
}

/** A result, from what was found and what the database says of it now. Seconds. */
export function searchItemView(found: FoundDocument, place: Place): SearchItem {
  const spoken = spokenSnippet(found.spoken)
  const { text: snippet, marks } = found.kind === 'passage' ? spoken : withoutMarks(found.text)
  const second = place.range?.start ?? found.starts[spoken.sentence]
  const end = place.range?.end ?? found.end
  return {
    id: found.id,
    kind: found.kind,
    title: place.title,
    snippet,
    marks,
    url: place.url(second ?? 0),
    ...(place.episode ? { episode: place.episode } : {}),
    ...(second === undefined ? {} : { start: second }),
    ...(second === undefined || end === null ? {} : { end }),
    ...drawn(found),
    ...(place.state ? { state: place.state } : {}),
  }
}
