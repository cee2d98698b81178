import type { ExplainerEntry } from '../entries'
import { countingAStand } from './explainers/counting-a-stand'
import { groundFitToWork } from './explainers/ground-fit-to-work'
import { heatUnits } from './explainers/heat-units'
import { shrink } from './explainers/shrink'

/** The explainers as shipped; each figure of a text is a claim of its own. */
export const explainers: ExplainerEntry[] = [groundFitToWork, countingAStand, heatUnits, shrink]
