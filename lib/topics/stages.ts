import { cottonStages } from './bbch/cotton'
import { maizeStages } from './bbch/maize'
import { potatoStages } from './bbch/potato'
import { riceStages } from './bbch/rice'
import type { StageTable } from './bbch/series'
import { soybeanStages } from './bbch/soybean'
import { tomatoStages } from './bbch/tomato'
import { wheatStages } from './bbch/wheat'
import { crops, cropWord, type Crop } from './crops'
import type { Topic } from './rules'
import { stageKeys, stageWord, type StageKey } from './stage-words'

/** Source: U. Meier (ed.), Growth stages of mono- and dicotyledonous plants, BBCH Monograph, 2nd ed. 2001; labels are ours. */
const tables: Record<Crop, StageTable> = {
  wheat: wheatStages,
  maize: maizeStages,
  soybean: soybeanStages,
  rice: riceStages,
  potato: potatoStages,
  tomato: tomatoStages,
  cotton: cottonStages,
}

const soil: Topic = {
  code: 'soil',
  label: 'Soil and seedbed, before sowing',
  kind: 'stage',
  crop: null,
  bbch: null,
  stage: 'soil',
}

function stageTopic(crop: Crop, bbch: string, stage: StageKey, words: string): Topic {
  return { code: `${crop}-${bbch}`, label: `${cropWord(crop)}: ${words}`, kind: 'stage', crop, bbch, stage }
}

/** A principal stage is offered only where the crop's key has a code under it: maize has no 2 and no 4. */
function cropTopics(crop: Crop): Topic[] {
  // Object keys like '10' sort before '00' in JavaScript, so the order is made here.
  const codes = Object.entries(tables[crop]).sort(([a], [b]) => a.localeCompare(b))
  return stageKeys.flatMap((stage) => {
    const under = codes.filter(([bbch]) => bbch.startsWith(stage))
    if (under.length === 0) return []
    const principal = stageTopic(crop, stage, stage, stageWord(stage, crop).toLowerCase())
    return [principal, ...under.map(([bbch, words]) => stageTopic(crop, bbch, stage, words))]
  })
}

/** `soil`, then each crop's principal and two-digit stages in order. */
export const stageTopics: Topic[] = [soil, ...crops.flatMap(cropTopics)]
