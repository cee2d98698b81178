/** The crops whose published stage keys we carry, in the order of the pickers. Browser-safe. */
export const crops = ['wheat', 'maize', 'soybean', 'rice', 'potato', 'tomato', 'cotton'] as const

export type Crop = (typeof crops)[number]

const words: Record<Crop, string> = {
  wheat: 'Wheat',
  maize: 'Maize',
  soybean: 'Soybean',
  rice: 'Rice',
  potato: 'Potato',
  tomato: 'Tomato',
  cotton: 'Cotton',
}

/** The crop as a heading writes it. */
export function cropWord(crop: Crop): string {
  return words[crop]
}
