import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'

const css = readFileSync('app/globals.css', 'utf8')

type Theme = Record<string, string>

const tokensIn = (block: string): Theme =>
  Object.fromEntries([...block.matchAll(/--color-([\w-]+): (#[0-9a-f]{6});/g)].map(([, name, value]) => [name, value]))

const light = tokensIn(css.slice(css.indexOf('@theme'), css.indexOf('@media screen')))
const dark: Theme = { ...light, ...tokensIn(css.slice(css.indexOf('@media screen'), css.indexOf('@layer base'))) }

/** Relative luminance and contrast as WCAG 2.2 defines them (definitions of the terms of those names). */
function luminance(hex: string): number {
  const channels = [1, 3, 5].map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
  const [r = 0, g = 0, b = 0] = channels.map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4))
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}

function contrast(theme: Theme, front: string, back: string): number {
  const [a, b] = [front, back].map((name) => luminance(theme[name] ?? `missing ${name}`)) as [number, number]
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05)
}

const papers = ['ground', 'sheet', 'mist']
const text = [
  ...['ink', 'ink-2', 'water', 'act', 'fault', 'flag'].flatMap((ink) => papers.map((paper) => [ink, paper])),
  ...['ground', 'sheet'].map((paper) => ['ink-3', paper]),
  ['on-loam', 'loam'],
  ['on-loam', 'loam-2'],
  ['on-loam-2', 'loam'],
  ['on-loam-2', 'loam-2'],
  ['on-act', 'act'],
  ['on-act', 'act-deep'],
  ['ink', 'act-tint'],
  ['ink', 'fault-tint'],
  ['fault', 'fault-tint'],
  ['ink', 'water-tint'],
  ['ink', 'flag-tint'],
] as [string, string][]
const edges = [
  ['edge', 'sheet'],
  ['edge', 'ground'],
  ['loam-rule', 'loam'],
  ['loam-rule', 'loam-2'],
  ['act', 'ground'],
  ['flag', 'sheet'],
] as [string, string][]

describe.each([
  ['light', light],
  ['dark', dark],
])('the %s theme', (_name, theme) => {
  it.each(text)('sets %s on %s at 4.5 to 1 or more (WCAG 2.2, 1.4.3)', (front, back) => {
    expect(contrast(theme, front, back)).toBeGreaterThanOrEqual(4.5)
  })

  it.each(edges)('draws %s on %s at 3 to 1 or more (WCAG 2.2, 1.4.11)', (front, back) => {
    expect(contrast(theme, front, back)).toBeGreaterThanOrEqual(3)
  })
})

describe('the measure of contrast', () => {
  it('gives 21 for black on white and 4.54 for #767676 on white (the published pair nearest to 4.5)', () => {
    const pair = { black: '#000000', white: '#ffffff', grey: '#767676' }
    expect(contrast(pair, 'black', 'white')).toBeCloseTo(21, 5)
    expect(contrast(pair, 'grey', 'white')).toBeCloseTo(4.54, 2)
  })
})
