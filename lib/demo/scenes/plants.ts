import { at, dot, ink, many, oval, path, stroke } from './brush'

/** A young cereal plant, its foot at x, y. */
export const tuft = (x: number, y: number, scale: number, colour: string = ink.leaf, lean = 0) =>
  at(
    x,
    y,
    stroke(
      `M0 0Q${-10 + lean} -24 ${-30 + lean} -26M0 0Q${2 + lean} -30 ${4 + lean * 2} -52M0 0Q${16 + lean} -20 ${40 + lean} -28`,
      colour,
      7,
    ),
    { scale },
  )

/** A standing stem with two leaves, foot at x, y, `tall` high. */
export function stem(x: number, y: number, tall: number, colour: string = ink.leaf, lean = 0): string {
  const tip = `${lean} ${-tall}`
  const leaves = `M${lean * 0.3} ${-tall * 0.35}q34 -50 62 -16M${lean * 0.5} ${-tall * 0.58}q-34 -50 -58 -10`
  return at(x, y, stroke(`M0 0Q0 ${-tall / 2} ${tip}`, colour, 7) + stroke(leaves, colour, 6))
}

/** A head of wheat, its lower end at x, y. */
export const wheatHead = (
  x: number,
  y: number,
  turn = 0,
  scale = 1,
  colour: string = ink.straw,
  awn: string = ink.strawDark,
) => at(x, y, head(colour, awn), { turn, scale })

function head(colour: string, awn: string): string {
  const awns =
    many(4, (i) => `M-8 ${-20 - i * 22}L-22 ${-86 - i * 20}M8 ${-20 - i * 22}L22 ${-86 - i * 20}`) + 'M0 -100L0 -160'
  const grains = many(5, (i) => {
    const y = -12 - i * 20
    return oval(-9, y, 8, 13, { fill: colour }) + oval(9, y - 6, 8, 13, { fill: colour })
  })
  return stroke(awns, awn, 2.5) + grains + oval(0, -108, 8, 13, { fill: colour })
}

/** A kernel lying flat, crease showing. */
export const kernel = (x: number, y: number, turn: number, colour: string = ink.strawDark) =>
  at(x, y, oval(0, 0, 13, 7.5, { fill: colour }) + stroke('M-8 0H8', ink.brown, 2), { turn })

export const panicleLength = 210

/** A panicle of rice pushed out of a sheath that ends at x, y; `full` from 0 to 1 is how far, tip first. */
export function panicle(x: number, y: number, full: number, lean: number, colour: string = ink.leafLight): string {
  const hidden = panicleLength * (1 - full)
  const branches = many(8, (i) => {
    const share = (i + 1) / 8
    const side = i % 2 ? 1 : -1
    const by = hidden - panicleLength * share
    if (by > -12) return ''
    const bx = lean * share * share
    const grains = many(4, (k) => oval(bx + side * (16 + k * 14), by - 26 + k * k * 3, 5, 10, { fill: colour }))
    return stroke(`M${bx} ${by}q${side * 26} -32 ${side * 62} -6`, colour, 3) + grains
  })
  return at(
    x,
    y,
    stroke(`M0 0Q0 ${hidden - panicleLength * 0.6} ${lean} ${hidden - panicleLength}`, colour, 4) + branches,
  )
}

/** A maize plant with `leaves` blades on alternate sides; foot at x, y. */
export function maize(x: number, y: number, leaves: number, scale = 1, lean = 0): string {
  const tall = 40 + leaves * 56
  const blades = many(leaves, (i) => {
    const side = i % 2 ? 1 : -1
    const from = 46 + i * 56
    const reach = 90 + i * 16
    const d = `M0 ${-from}C${side * 36} ${-from - 62} ${side * reach} ${-from - 74} ${side * (reach + 50)} ${-from - 8 + lean}C${side * reach} ${-from - 40} ${side * 50} ${-from - 26} 0 ${-from + 12}Z`
    return path(d, { fill: i % 2 ? ink.leaf : ink.leafDark })
  })
  return at(x, y, blades + stroke(`M0 0V${-tall}`, ink.leafLight, 20), { scale })
}

/** A bean leaf of three leaflets at x, y. */
export const trefoil = (x: number, y: number, turn: number, scale = 1, colour: string = ink.leaf) => {
  const leaflet = 'M0 0Q-34 -30 0 -84Q34 -30 0 0Z'
  const three = [-62, 0, 62].map((angle) =>
    at(0, -24, path(leaflet, { fill: colour }) + stroke('M0 -6V-60', ink.leafDark, 2.5, 0.6), { turn: angle }),
  )
  return at(x, y, stroke('M0 0V-26', ink.leafDark, 5) + three.join(''), { turn, scale })
}

/** A flower of the bean family, `open` from 0 to 1. */
export const beanFlower = (x: number, y: number, open: number) =>
  at(
    x,
    y,
    oval(-9 * open, -6, 7 + 5 * open, 12 + 4 * open, { fill: '#b9aede' }) +
      oval(9 * open, -6, 7 + 5 * open, 12 + 4 * open, { fill: '#b9aede' }) +
      oval(0, 2, 6, 10, { fill: '#7b6fa8' }) +
      dot(0, -4, 3 * open, ink.white),
  )

/** Roots below x, y. */
export const roots = (x: number, y: number, deep: number, colour = '#d9cdb8') =>
  at(
    x,
    y,
    stroke(
      `M0 0q-8 ${deep * 0.5} -34 ${deep * 0.8}M0 0q2 ${deep * 0.6} 0 ${deep}M0 0q10 ${deep * 0.4} 38 ${deep * 0.7}M-10 ${deep * 0.4}q-20 8 -34 4M6 ${deep * 0.4}q20 6 30 0`,
      colour,
      4,
    ),
  )
