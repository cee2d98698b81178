import type { TermEntry } from '../entries'
import { growthTerms } from './terms/growth'
import { harvestTerms } from './terms/harvest'
import { machineryTerms } from './terms/machinery'
import { plantPartTerms } from './terms/plant-parts'
import { tillageTerms } from './terms/tillage'
import { waterTerms } from './terms/water'

/** The glossary as shipped. Definitions are ours; figures belong into explainers, where they are claims. */
export const terms: TermEntry[] = [
  ...tillageTerms,
  ...waterTerms,
  ...growthTerms,
  ...plantPartTerms,
  ...machineryTerms,
  ...harvestTerms,
]
