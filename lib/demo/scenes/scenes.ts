import type { Scene } from './brush'
import { beanCracking, collars, heatDay, heatSteps, riceHeat } from './corn'
import { beanFlowering, combining, grainFlow } from './harvest'
import { firstNode, tillers, twoHoops } from './jointing'
import { leveeGate, riceSpike, seedSoak, terraces } from './paddy'
import { greenRingScene, panicleScene, waterTube } from './rice'
import { drillPass, emergence, kernels, sumBoard } from './seeding'
import { fieldAfterRain, thread, tillagePass, wettingFront } from './soil'
import { crown, frostField, hoop, zigzag } from './stand'

/** Every picture that a chapter of the story may name. */
export const scenes: Record<string, Scene> = {
  'field-after-rain': fieldAfterRain,
  'wetting-front': wettingFront,
  thread,
  'tillage-pass': tillagePass,
  kernels,
  'sum-board': sumBoard,
  drill: drillPass,
  emergence,
  'frost-field': frostField,
  hoop,
  crown,
  zigzag,
  'first-node': firstNode,
  tillers,
  'two-hoops': twoHoops,
  collars,
  'heat-day': heatDay,
  'heat-steps': heatSteps,
  'bean-cracking': beanCracking,
  combine: combining,
  'grain-flow': grainFlow,
  'bean-flower': beanFlowering,
  terraces,
  'levee-gate': leveeGate,
  'seed-soak': seedSoak,
  'rice-spike': riceSpike,
  'green-ring': greenRingScene,
  'rice-heat': riceHeat,
  'water-tube': waterTube,
  panicle: panicleScene,
}
