import { close, sky } from './backdrops'
import { at, dot, ink, many, oval, path, ramp, rect, scatter, stroke, sway, type Scene } from './brush'
import { label } from './lettering'
import { combine } from './machines'
import { beanFlower, trefoil, wheatHead } from './plants'

const headsInFront = (t: number) =>
  many(7, (i) => {
    const hx = 790 + i * 76
    const turn = (i - 3) * 6 + sway(t, 3, i / 7) * 4
    return (
      stroke(`M${hx} 730Q${hx} 620 ${hx + turn * 2} ${560 - (i % 3) * 30}`, ink.strawDark, 7) +
      wheatHead(hx + turn * 2, 560 - (i % 3) * 30, turn, 0.95)
    )
  })

/** The combine crosses ripe wheat and leaves stubble; a handful of heads stands in front. */
export const combining: Scene = ({ t, of }) => {
  const x = 120 + (t / of) * 620
  const uncut = many(60, (i) => {
    const wx = i * 22 + 6
    return wx > x + 180
      ? stroke(
          `M${wx} 470q${sway(t, 3, i / 9) * 5} -50 ${8 + sway(t, 3, i / 9) * 9} -104`,
          i % 3 ? ink.straw : ink.strawDark,
          7,
        )
      : stroke(`M${wx} 470v-22`, ink.ironLight, 5)
  })
  const chaff = many(14, (i) =>
    dot(x - 350 - ((t * 90 + i * 29) % 190), 330 + ((i * 37) % 120), 4, ink.straw, { opacity: 0.7 }),
  )
  return (
    sky(300) +
    rect(0, 300, 1280, 420, ink.stubble) +
    rect(0, 470, 1280, 250, '#b49b60') +
    combine(x, 470, t) +
    uncut +
    chaff +
    headsInFront(t)
  )
}

const wagon =
  path('M200 430H1080L1020 620H260Z', { fill: ink.waterDeep }) +
  rect(190, 416, 900, 26, ink.iron) +
  dot(400, 650, 56, ink.ironDark) +
  dot(400, 650, 24, ink.ironLight) +
  dot(880, 650, 56, ink.ironDark) +
  dot(880, 650, 24, ink.ironLight)
const spout = path('M1280 40L690 120Q600 130 606 190H676Q680 170 720 168L1280 100Z', { fill: ink.iron })
const bin =
  rect(40, 130, 250, 360, '#c9ccc6') +
  path('M26 136L165 40L304 136Z', { fill: ink.ironLight }) +
  stroke(
    many(5, (i) => `M40 ${190 + i * 60}H290`),
    '#aeb3ac',
    5,
  ) +
  rect(140, 400, 60, 90, ink.iron)

/** Grain falls from the spout into the wagon, and the heap rises. */
export const grainFlow: Scene = ({ t, of, line, since }) => {
  const high = 116 + 84 * ramp(t, 0, of)
  const next = scatter(41)
  const falling = many(70, () => {
    const fall = (next() + t * 1.3) % 1
    const spread = (next() - 0.5) * (26 + fall * 60)
    return oval(640 + spread, 190 + fall * (356 - high), 6, 9, { fill: next() > 0.5 ? ink.straw : ink.strawDark })
  })
  const stream = path(`M622 180H660L690 ${548 - high}H596Z`, { fill: ink.straw, opacity: 0.8 })
  const heap = path(`M250 560Q430 ${560 - high * 0.5} 640 ${540 - high}Q850 ${560 - high * 0.5} 1030 560Z`, {
    fill: ink.strawDark,
  })
  return (
    sky(420) +
    rect(0, 420, 1280, 300, ink.stubble) +
    bin +
    heap +
    stream +
    falling +
    wagon +
    spout +
    (line >= 1 && (line > 1 || since > 2.5) ? label(770, 480, '5.88 %') : '')
  )
}

const bee = (t: number) =>
  at(
    820 + sway(t, 5) * 120,
    330 + sway(t, 2.5) * 36,
    oval(0, 0, 17, 11, { fill: ink.straw }) +
      stroke('M-4 -10V10M6 -9V9', ink.ironDark, 5) +
      oval(-2, -14, 14, 7, { fill: ink.white, opacity: 0.85 }),
  )

/** A bean stem with flowers opening from the lowest node upward. */
export const beanFlowering: Scene = ({ t, of }) => {
  const wind = sway(t, 3) * 2
  const nodes = many(4, (i) => {
    const y = 600 - i * 140
    const side = i % 2 ? 1 : -1
    const open = ramp(t, 1 + i * 2.4, 4 + i * 2.8)
    const reach = 190 - i * 24
    const flowers = many(3, (k) => beanFlower(640 - side * (44 + k * 34), y - 34 - k * 26, i < 3 ? open : 0.25))
    const raceme = stroke(`M640 ${y}L${640 - side * 122} ${y - 84}`, ink.leafDark, 5)
    return (
      raceme +
      stroke(`M640 ${y}Q${640 + side * 70} ${y - 60} ${640 + side * reach} ${y - 84}`, ink.leafDark, 9) +
      trefoil(640 + side * reach, y - 84, side * (58 + wind), 1.25 - i * 0.1, i % 2 ? ink.leaf : ink.leafDark) +
      flowers
    )
  })
  return (
    close() +
    stroke(`M640 720Q632 400 640 110`, ink.leaf, 20) +
    nodes +
    trefoil(640, 130, wind * 2, 0.8, ink.leafLight) +
    (t > of * 0.3 ? bee(t) : '')
  )
}
