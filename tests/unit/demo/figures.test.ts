import { describe, expect, it } from 'vitest'
import { filmed } from '@/lib/demo/story/story'

const readings = filmed.flatMap((episode) =>
  episode.chapters.flatMap((chapter) =>
    chapter.lines.flatMap((line) =>
      line.reading && line.key ? [{ ...line.reading, key: line.key, text: line.text }] : [],
    ),
  ),
)

const said = (key: string) => {
  const reading = readings.find((one) => one.key === key)
  if (!reading) throw new Error(`no reading at ${key}`)
  return reading.value
}

const capped = (value: number, low: number, high: number) => Math.min(Math.max(value, low), high)
const cornDay = (high: number, low: number) => (capped(high, 50, 86) + capped(low, 50, 86)) / 2 - 50
const riceDay = (high: number, low: number) => (Math.min(high, 94) + Math.min(low, 70)) / 2 - 50

describe('figures said on camera agree with the publications', () => {
  it.each([
    // Saxton & Rawls 2006, texture table: silt loam field capacity 30.5 %; front depth = rain / (capacity - before).
    { key: 'front', value: 25 / (0.305 - 0.18), source: 'Saxton & Rawls 2006' },
    // ASTM D4318 by way of the glossary: the thread at the plastic limit is 3 mm thick.
    { key: 'thread', value: 3, source: 'ASTM D4318, from memory' },
    // 360 Ag Consulting: 30 plants/ft2 * 38 g at 0.94 survival, rule of ten.
    { key: 'rule-of-ten', value: Math.round((30 * 38) / 0.94 / 10), source: '360 Ag Consulting' },
    // The exact divisor is 453.59237 g/lb over 43,560 ft2/ac times 1,000 seeds: 10.413 (NIST SP 811 units).
    {
      key: 'exact-rate',
      value: Math.round((30 * 38 * 10) / 0.94 / (453.59237 / 43.56)) / 10,
      source: 'NIST SP 811',
    },
    // K-State: 270 heat units in Fahrenheit from planting to half emergence of wheat.
    { key: 'wheat-emergence', value: 270, source: 'K-State myfields.info' },
    // An acre is 43,560 square feet (NIST Handbook 44, appendix C).
    { key: 'per-acre', value: 19 * 43_560, source: 'NIST Handbook 44' },
    // BBCH 31: first node at least 1 cm above the tillering node.
    { key: 'node', value: 1, source: 'Meier 2001' },
    { key: 'hoop-size-end', value: 144 / 7.5, source: 'arithmetic: 144 square inches' },
    // Purdue: ((80 + 55) / 2) - 50 or 17.5; Waushara Argus, UW Extension: ((86 + 65) / 2) - 50 = 25.5.
    { key: 'warm-day', value: cornDay(80, 55), source: 'Purdue Extension' },
    { key: 'hot-day', value: cornDay(90, 65), source: 'UW Extension' },
    // Purdue: 100 to 120 from planting to emergence, 115 typical.
    { key: 'corn-emergence', value: 115, source: 'Purdue Agronomy' },
    // Water shrink on a wet basis: 100 (20 - 15) / (100 - 15).
    { key: 'shrink', value: Math.round(50_000 / 85) / 100, source: 'SDSU Extension formula' },
    { key: 'soak', value: 36, source: 'trade press 2011: 24 to 36 hours' },
    // BBCH 32 of rice: panicle 1 to 2 mm.
    { key: 'panicle-length', value: 2, source: 'Meier 2001' },
    // University of Arkansas DD50, caps 94 and 70, from memory; 32 is its daily ceiling.
    { key: 'rice-day', value: riceDay(88, 70), source: 'DD50, caps from memory' },
    { key: 'rice-ceiling', value: riceDay(95, 75), source: 'DD50, caps from memory' },
  ])('$key is $value ($source)', ({ key, value }) => {
    expect(said(key)).toBeCloseTo(value, 6)
  })

  it('says 17.5 and 25.5 heat units, and 5.88 percent, in so many figures', () => {
    expect(cornDay(80, 55)).toBe(17.5)
    expect(cornDay(90, 65)).toBe(25.5)
    expect(said('shrink')).toBe(5.88)
  })

  it('finds the eighth collar at 785 units: 115 to come up, 82 for each collar (Purdue)', () => {
    expect(Math.floor((785 - 115) / 82)).toBe(8)
  })

  it('names a ring of 13.5 inches for one square foot: 2 √(144 / π) is 13.54', () => {
    const ring = filmed
      .flatMap((e) => e.chapters.flatMap((c) => c.lines))
      .find((line) => line.reading?.quantity === 'hoop of one square foot')
    expect(ring?.reading?.value).toBeCloseTo(2 * Math.sqrt(144 / Math.PI), 1)
  })

  it('counts stands inside what is wanted: rice 15 to 20 plants per square foot (Arkansas FSA2157)', () => {
    expect(said('rice-stand')).toBeGreaterThanOrEqual(15)
    expect(said('rice-stand')).toBeLessThanOrEqual(20)
  })
})
