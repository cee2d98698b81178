import { collarsAndCracking } from './collars-and-cracking'
import { firstNode } from './first-node'
import { fitToWork } from './fit-to-work'
import { greenRing } from './green-ring'
import { levelAndFlooded } from './level-and-flooded'
import { plantsNotBags } from './plants-not-bags'
import type { StoryEpisode } from './types'
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

/** Every spoken sentence of an episode with the chapter it belongs to. */
export function linesOf(episode: StoryEpisode) {
  return episode.chapters.flatMap((chapter, index) => chapter.lines.map((line) => ({ line, chapter: index })))
}
