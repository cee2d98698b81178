import { cutting, field, sky } from './backdrops'
import { at, dot, ink, many, oval, path, ramp, rect, scatter, stroke, sway, type Scene } from './brush'
import { label } from './lettering'
import { pulling } from './machines'

/** Pale crust, two puddles that shrink while the sentence about the crust is said. */
export const fieldAfterRain: Scene = ({ t, of, line }) => {
  const left = 1 - ramp(t, 2, of) * 0.35
  const puddle = (x: number, y: number, r: number) =>
    oval(x, y, r * 1.06, r * 0.27, { fill: ink.soilWet, opacity: 0.7 }) +
    oval(x, y, r * left, r * 0.23 * left, { fill: ink.water }) +
    stroke(`M${x - r * 0.4 + sway(t, 4) * 10} ${y - 4}h${Math.round(r * 0.5)}`, ink.white, 4, 0.7)
  const next = scatter(3)
  const cracks = many(26, () => {
    const y = 300 + next() * 400
    const x = next() * 1280
    return `M${Math.round(x)} ${Math.round(y)}l${Math.round(16 + next() * 40)} ${Math.round(-6 + next() * 12)}l${Math.round(next() * 24)} 12`
  })
  const crust = stroke(cracks, ink.soilDark, 3, 0.35 + 0.3 * ramp(line, 1, 2))
  return (
    sky(210) +
    field(210, '#977a5b', '#836749') +
    crust +
    puddle(360, 560, 210) +
    puddle(930, 400, 120) +
    gauge(1090, 600)
  )
}

/** A rain gauge on its post, 25 mm in it. */
const gauge = (x: number, y: number) =>
  at(
    x,
    y,
    rect(-9, -40, 18, 150, ink.plankDark) +
      rect(-32, -250, 64, 214, ink.white, { opacity: 0.85 }) +
      rect(-26, -104, 52, 64, ink.waterDeep) +
      stroke(
        many(7, (i) => `M-26 ${-62 - i * 26}h${i % 2 ? 18 : 28}`),
        ink.ironDark,
        3,
      ) +
      stroke('M-44 -256L-32 -246V-38H32V-246L44 -256', ink.ironDark, 5),
  )

const cutSurface = 230
const rule = at(
  1010,
  cutSurface,
  rect(0, 0, 74, 470, ink.paper) +
    stroke(
      many(10, (i) => `M0 ${i * 50 + 1}h${i % 2 ? 24 : 42}`),
      ink.ironDark,
      4,
    ),
)
const spade = at(
  240,
  cutSurface + 36,
  rect(-9, -230, 18, 250, ink.plankDark) +
    stroke('M-34 -232H34', ink.ironDark, 16) +
    path('M-48 0H48V120Q30 190 0 204Q-30 190 -48 120Z', { fill: ink.ironLight }),
  { turn: 4 },
)

/** The dark band sinks through the cut ground to 200 mm on the rule (1 mm is 2 units). */
export const wettingFront: Scene = ({ t, line, since }) => {
  const surface = cutSurface
  const sunk = line < 3 ? 0.55 * ramp(t, 1, 12) : line === 3 ? 0.55 + 0.45 * ramp(since, 0, 4) : 1
  const depth = 400 * sunk
  const edge = surface + depth
  const front = `M0 ${surface}H1280V${edge}Q1120 ${edge + 22} 960 ${edge}T640 ${edge}T320 ${edge}T0 ${edge}z`
  const next = scatter(21)
  const drops = many(22, () => {
    const x = 60 + next() * 1160
    const fall = ((t * 0.5 + next()) % 1) * depth
    return dot(x, surface + fall, 4, ink.water, { opacity: depth > 60 ? 0.8 : 0 })
  })
  const shown = line > 3 || (line === 3 && since > 3) ? label(690, edge - 92, '200 mm') : ''
  return (
    sky(surface) + cutting(surface) + path(front, { fill: ink.soilWet, opacity: 0.6 }) + drops + rule + spade + shown
  )
}

const board =
  path('M150 500L230 250H1050L1130 500Z', { fill: ink.plank }) + path('M150 500H1130V530H150Z', { fill: ink.plankDark })
const grain = stroke(
  'M220 330Q640 310 1060 330M200 400Q640 384 1080 400M180 460Q640 446 1104 460',
  ink.plankDark,
  3,
  0.5,
)

/** The thread, in nine lengths that come apart as it breaks. */
function pieces(half: number, thick: number, broken: number, colour: string): string {
  return many(9, (i) => {
    const x = -half + (i * half * 2) / 8
    const drop = broken * (i % 2 ? 12 : -8)
    return stroke(`M${x} ${drop}l${((half * 2) / 8) * (1 - 0.28 * broken)} ${broken * (i % 3 ? 5 : -5)}`, colour, thick)
  })
}

/** A thread of soil rolled out on a board; at the plastic limit it breaks into pieces. */
export const thread: Scene = ({ t, line, since }) => {
  const rolled = line === 0 ? ramp(t, 1, 5) : 1
  const long = line === 2
  const thick = 64 - 44 * rolled
  const broken = line === 1 ? ramp(since, 2.5, 4) : line === 3 ? 1 : 0
  const half = 120 + 220 * rolled + (long ? 90 * ramp(since, 0, 2) : 0)
  const shown = line >= 1 ? label(884, 560, '3 mm') + stroke('M900 540V430', ink.plate, 4) : ''
  const hand = palm(
    640 + sway(t, 1.6) * 70 * (line === 0 || long ? 1 : 0),
    250 - 96 * broken - (line === 1 || line === 3 ? 70 : 0),
  )
  return (
    rect(0, 0, 1280, 720, ink.haze) +
    path('M0 560Q320 530 640 556T1280 540V720H0z', { fill: ink.farTrees, opacity: 0.6 }) +
    board +
    grain +
    at(640, 400, pieces(half, thick, broken, long ? ink.soilWet : ink.soilDark)) +
    hand +
    shown
  )
}

/** A flat hand from above, fingers down. */
const palm = (x: number, y: number) => {
  const skin = '#a9744f'
  const fingers = [-78, -28, 24, 74].map((dx, i) => stroke(`M${dx} 0V${[74, 100, 96, 66][i]}`, skin, 44)).join('')
  const creases = stroke('M-54 8V40M-2 10V52M48 10V50', '#8a5a3a', 3, 0.6)
  return at(
    x,
    y,
    path('M-100 -150H96V10Q0 40 -100 10Z', { fill: skin }) +
      stroke('M-104 -60Q-150 -20 -138 34', skin, 42) +
      fingers +
      creases +
      rect(-104, -240, 204, 110, ink.waterDeep),
  )
}

/** One shallow pass: the tractor crosses, worked ground is left behind the sweeps. */
export const tillagePass: Scene = ({ t, of }) => {
  const x = -60 + ramp(t, 0, of) * 900 + t * 8
  const next = scatter(11)
  const worked = rect(0, 430, Math.max(0, x - 40), 34, ink.soilDark)
  const crumbs = many(60, () => {
    const cx = next() * 1280
    return cx < x - 60 ? dot(cx, 426 + next() * 12, 3 + next() * 5, ink.furrow) : ''
  })
  const dust = many(6, (i) =>
    dot(x - 60 - i * 34, 420 - ((t * 20 + i * 17) % 46), 16 + i * 3, ink.crumb, { opacity: 0.28 }),
  )
  return (
    sky(300) +
    rect(0, 300, 1280, 146, '#8d7152') +
    cutting(430, ink.soil) +
    worked +
    crumbs +
    dust +
    pulling(x, 428, t, 'cultivator')
  )
}
