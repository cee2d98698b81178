/** What a scene is told: seconds since it began, its length, and which of its sentences is being said since when. */
export type Clock = { t: number; of: number; line: number; since: number }

/** A picture 1280 by 720, as the inside of an SVG. */
export type Scene = (clock: Clock) => string

export const width = 1280
export const height = 720

export const ink = {
  sky: '#d7e4e6',
  haze: '#e6eeec',
  trees: '#93ab98',
  farTrees: '#b3c4b6',
  soil: '#7d6145',
  soilDark: '#5f4833',
  soilWet: '#4d3a2a',
  furrow: '#6a5038',
  crumb: '#957556',
  leaf: '#4f8a45',
  leafLight: '#8fb36a',
  leafDark: '#3a6a3c',
  straw: '#d6a93f',
  strawDark: '#b08a3a',
  stubble: '#c2a86a',
  water: '#9fc0cb',
  waterDeep: '#6f9db0',
  white: '#f4f6f2',
  paper: '#ece9df',
  plank: '#b39470',
  plankDark: '#9a7c5b',
  iron: '#5b554c',
  ironDark: '#37332d',
  ironLight: '#8c8577',
  mark: '#b8430f',
  plate: '#17211b',
  brown: '#8a6a3f',
} as const

type Style = { fill?: string; stroke?: string; width?: number; opacity?: number; dash?: string }

const round = (value: number) => Math.round(value * 10) / 10

const hundredth = (value: number) => Math.round(value * 100) / 100

// Paint made thin, not shapes: a shape's `opacity` makes the renderer compose a layer of its own, at twice the cost.
const style = ({ fill = 'none', stroke, width: line = 4, opacity, dash }: Style) =>
  ` fill="${fill}"` +
  (stroke ? ` stroke="${stroke}" stroke-width="${line}" stroke-linecap="round" stroke-linejoin="round"` : '') +
  (dash ? ` stroke-dasharray="${dash}"` : '') +
  (opacity === undefined ? '' : ` fill-opacity="${hundredth(opacity)}" stroke-opacity="${hundredth(opacity)}"`)

export const rect = (x: number, y: number, w: number, h: number, fill: string, more: Style = {}) =>
  `<rect x="${round(x)}" y="${round(y)}" width="${round(w)}" height="${round(h)}"${style({ ...more, fill })}/>`

export const path = (d: string, look: Style) => `<path d="${d}"${style(look)}/>`

export const stroke = (d: string, colour: string, line: number, opacity?: number) =>
  path(d, { stroke: colour, width: line, opacity })

export const dot = (x: number, y: number, r: number, fill: string, more: Style = {}) =>
  `<circle cx="${round(x)}" cy="${round(y)}" r="${round(r)}"${style({ fill, ...more })}/>`

export const oval = (x: number, y: number, rx: number, ry: number, look: Style) =>
  `<ellipse cx="${round(x)}" cy="${round(y)}" rx="${round(rx)}" ry="${round(ry)}"${style(look)}/>`

/** Moves, turns (degrees) and scales what it holds. */
export const at = (x: number, y: number, inside: string, { turn = 0, scale = 1 } = {}) =>
  `<g transform="translate(${round(x)} ${round(y)})${turn ? ` rotate(${round(turn)})` : ''}${scale === 1 ? '' : ` scale(${Math.round(scale * 100) / 100})`}">${inside}</g>`

export const many = (count: number, draw: (index: number) => string) =>
  Array.from({ length: count }, (_, i) => draw(i)).join('')

/** 0 before `from`, 1 after `to`, smooth between. */
export function ramp(value: number, from: number, to: number): number {
  const share = Math.min(1, Math.max(0, (value - from) / (to - from)))
  return share * share * (3 - 2 * share)
}

/** Swings between -1 and 1 once per `period` seconds; `shift` is a share of the period. */
export const sway = (t: number, period: number, shift = 0) => Math.sin((t / period + shift) * 2 * Math.PI)

/** The same scatter of numbers in [0, 1) on every machine and every frame. */
export function scatter(seed: number): () => number {
  let state = seed
  return () => {
    state = (state + 0x6d2b79f5) | 0
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state)
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296
  }
}

export const picture = (inside: string) =>
  `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" viewBox="0 0 ${width} ${height}">${inside}</svg>`
