import type { Crop } from './crops'

/** A principal stage, or the ground before sowing. It chooses the pattern, the colour and the word. */
export const stageKeys = ['soil', '0', '1', '2', '3', '4', '5', '6', '7', '8', '9'] as const

export type StageKey = (typeof stageKeys)[number]

/** For any crop, or when the crop is not known. */
const general: Record<StageKey, string> = {
  soil: 'Seedbed',
  0: 'Sprouting',
  1: 'Leaves',
  2: 'Tillers or side shoots',
  3: 'Stem',
  4: 'Boot or harvested leaf and tuber',
  5: 'Heading or buds',
  6: 'Flowering',
  7: 'Fruit',
  8: 'Ripening',
  9: 'After ripening',
}

const cereal = { 2: 'Tillering', 3: 'Stem elongation', 4: 'Booting', 5: 'Heading', 7: 'Grain fill' }

/** Where one crop's people say it otherwise. */
const byCrop: Record<Crop, Partial<Record<StageKey, string>>> = {
  wheat: cereal,
  rice: cereal,
  maize: { 3: 'Stem elongation', 5: 'Tassel', 7: 'Grain fill' },
  soybean: { 2: 'Side shoots', 4: 'Forage cut', 5: 'Buds', 7: 'Pods', 9: 'Leaf drop' },
  potato: { 2: 'Side shoots', 3: 'Rows closing', 4: 'Tubers', 5: 'Buds', 7: 'Berries', 9: 'Vines dying' },
  tomato: { 2: 'Side shoots', 5: 'Trusses', 7: 'Fruit' },
  cotton: { 2: 'Branches', 3: 'Rows closing', 5: 'Squares', 7: 'Bolls', 8: 'Open bolls', 9: 'Leaf drop' },
}

/** The word that always stands beside a stage's pattern. */
export function stageWord(stage: StageKey, crop?: Crop | null): string {
  return (crop && byCrop[crop][stage]) || general[stage]
}
