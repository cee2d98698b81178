import { collarsAndCracking } from './collars-and-cracking'
import { firstNode } from './first-node'
import { fitToWork } from './fit-to-work'
import { greenRing } from './green-ring'
import { levelAndFlooded } from './level-and-flooded'
import { plantsNotBags } from './plants-not-bags'
import type { Speaker, StoryEpisode } from './types'
import { wheatOff } from './wheat-off'
import { wheatStand } from './wheat-stand'
import { withoutFootage } from './without-footage'

/** The films, in the order in which they were made. */
export const filmed: StoryEpisode[] = [
  fitToWork,
  plantsNotBags,
  wheatStand,
  firstNode,
  levelAndFlooded,
  collarsAndCracking,
  wheatOff,
  greenRing,
]

export const episodes: StoryEpisode[] = [...filmed, ...withoutFootage]

export type Phrase = {
  text: string
  voiced: string
  by: Speaker | undefined
  chapter: number
  /** Which sentence of its chapter it belongs to. */
  line: number
  key: string | null
  /** Silence after it, milliseconds; null for the usual. */
  rest: number | null
}

/** Between the phrases of one sentence. */
const breathMs = 110

/** Every spoken phrase of an episode in order. */
export function phrasesOf(episode: StoryEpisode): Phrase[] {
  return episode.chapters.flatMap(({ lines }, chapter) =>
    lines.flatMap((line, index) => {
      const voiced = (line.voiced ?? line.text).split(' | ')
      return line.text.split(' | ').map((text, part, parts) => ({
        text,
        voiced: voiced[part] ?? text,
        by: line.by,
        chapter,
        line: index,
        key: line.key ?? null,
        rest: part < parts.length - 1 ? breathMs : (line.rest ?? null),
      }))
    }),
  )
}
