import { close, cutting, sky } from './backdrops'
import { at, dot, ink, many, oval, path, ramp, rect, stroke, sway, type Scene } from './brush'
import { label } from './lettering'
import { maize, roots } from './plants'

/** One young plant, large: each collar is ringed as it is counted. */
export const collars: Scene = ({ t, line, since }) => {
  const spots = [
    [640, 566],
    [640, 470],
    [640, 366],
  ]
  const counted = line < 2 ? 0 : line === 2 ? Math.min(3, 1 + Math.floor(since / 0.55)) : 3
  const blade = (d: string, colour: string) => path(d, { fill: colour })
  const wind = sway(t, 3) * 6
  const leaves =
    blade(`M640 580C590 520 520 516 470 ${556 + wind}C500 590 570 596 640 600Z`, ink.leafLight) +
    blade(`M640 486C720 380 860 360 960 ${470 + wind}C860 430 740 450 640 506Z`, ink.leaf) +
    blade(`M640 384C540 240 400 220 290 ${344 - wind}C410 300 530 320 640 410Z`, ink.leafDark) +
    blade(`M650 320C700 180 800 120 900 ${150 + wind}C800 170 720 240 664 340Z`, ink.leaf) +
    blade(`M632 320C610 180 590 110 ${540 + wind} 60C610 90 650 180 652 330Z`, ink.leafLight)
  const stalk = path('M612 640Q618 460 624 300H658Q664 460 670 640Z', { fill: '#a9c486' })
  const bands = spots
    .map(([x = 0, y = 0]) => path(`M${x - 26} ${y}q26 -14 52 0v12q-26 -12 -52 0z`, { fill: '#e9efd3' }))
    .join('')
  const rings = spots
    .slice(0, counted)
    .map(([x = 0, y = 0]) => oval(x, y + 4, 56, 26, { stroke: ink.mark, width: 6 }))
    .join('')
  const first = line === 0 ? oval(546, 566, 112, 52, { stroke: ink.white, width: 6, dash: '12 14' }) : ''
  const groundLine = path('M0 636Q320 624 640 636T1280 630V720H0Z', { fill: ink.soil })
  return (
    close() + leaves + stalk + bands + groundLine + first + rings + (counted === 3 ? label(920, 560, '3 collars') : '')
  )
}

type Day = { low: number; high: number; cap: number; count: string | null }

/** One day's warmth as a curve between 30 and 100 °F, base and ceiling ruled across, what counts filled in. */
function dayCurve({ low, high, cap, count }: Day, drawn: number): string {
  const y = (degrees: number) => 620 - (degrees - 30) * 7.2
  const warmth = (share: number) => low + (high - low) * (0.5 - 0.5 * Math.cos(share * 2 * Math.PI))
  const points = Array.from({ length: 49 }, (_, i) => i / 48).filter((share) => share <= drawn)
  const line = points
    .map((share, i) => `${i ? 'L' : 'M'}${Math.round(160 + share * 880)} ${Math.round(y(warmth(share)))}`)
    .join('')
  const filled = points
    .map((share) => `L${Math.round(160 + share * 880)} ${Math.round(y(Math.min(cap, warmth(share))))}`)
    .join('')
  const end = Math.round(160 + (points.at(-1) ?? 0) * 880)
  return (
    path(`M160 ${y(50)}${filled}L${end} ${y(50)}Z`, { fill: ink.straw, opacity: 0.75 }) +
    stroke(`M160 ${y(50)}H1040`, ink.waterDeep, 5) +
    path(`M160 ${y(cap)}H1040`, { stroke: ink.mark, width: 5, dash: '16 14' }) +
    stroke(line, ink.ironDark, 9) +
    stroke('M160 90V640H1060', ink.ironDark, 6) +
    (count ? label(470, y(50) + 20, count, 44) : '')
  )
}

const sheetBehind =
  rect(0, 0, 1280, 720, ink.haze) +
  rect(70, 40, 1140, 640, ink.white) +
  stroke(
    many(6, (i) => `M160 ${620 - i * 108}H1040`),
    '#e3e2dc',
    3,
  )
const sunAt = (share: number) => dot(180 + share * 880, 200 - Math.sin(share * Math.PI) * 110, 34, '#e6bc57')

export const heatDay: Scene = ({ t, line, since }) => {
  const hot = line >= 2
  const drawn = line === 0 ? ramp(t, 0.5, 4) : line === 2 ? ramp(since, 0, 2.5) : 1
  const count = line === 1 && since > 4 ? '17.5' : hot && (line > 2 || since > 5) ? '25.5' : null
  return (
    sheetBehind +
    sunAt(drawn) +
    dayCurve(hot ? { low: 65, high: 90, cap: 86, count } : { low: 55, high: 80, cap: 86, count }, drawn)
  )
}

export const riceHeat: Scene = ({ t, line, since }) => {
  const hot = line >= 2
  const drawn = line === 0 ? ramp(t, 0.5, 4) : ramp(since, 0, 2)
  const count = line === 1 && since > 2.4 ? '29' : hot && since > 2.4 ? '32' : null
  return (
    sheetBehind +
    sunAt(drawn) +
    dayCurve(hot ? { low: 75, high: 95, cap: 94, count } : { low: 70, high: 88, cap: 94, count }, drawn)
  )
}

/** Plants in a row, each one collar further, over a rule of heat units that fills from left to right. */
export const heatSteps: Scene = ({ t, of, line }) => {
  const filled = ramp(t, 0.5, of * 0.7)
  const steps = many(8, (i) => {
    const shown = filled > (i + 0.6) / 8.4
    return shown
      ? maize(190 + i * 130, 540, i + 1, 0.34 + i * 0.035, sway(t, 3, i / 8) * 8)
      : dot(190 + i * 130, 540, 7, ink.straw)
  })
  const bar =
    rect(100, 604, 1080, 44, ink.paper) +
    rect(100, 604, 1080 * filled, 44, ink.straw) +
    stroke('M100 604H1180V648H100Z', ink.ironDark, 4) +
    stroke(
      many(8, (i) => `M${258 + i * 113} 604v44`),
      ink.ironDark,
      3,
    )
  return (
    sky(330) +
    rect(0, 330, 1280, 390, ink.soil) +
    rect(0, 540, 1280, 180, ink.soilDark) +
    steps +
    bar +
    (line >= 2 ? label(150, 130, '785 units') : '')
  )
}

/** A bean hauls its seed leaves through the crust, bent double, then opens them. */
export const beanCracking: Scene = ({ t, of }) => {
  const surface = 400
  const beans = many(5, (i) => {
    const x = 170 + i * 235
    const share = ramp(t, i * 0.5, of * 0.8 + i * 0.3)
    const lift = 150 - share * 300
    const unbent = ramp(share, 0.62, 1)
    const hook =
      unbent < 0.5 ? `M-10 120Q-16 ${lift - 40} 14 ${lift - 60}T46 ${lift + 4}` : `M-10 120Q-12 0 0 ${lift - 40}`
    const open = 20 + unbent * 60
    const seedLeaf = (turn: number) =>
      at(0, 0, oval(0, -34, 22, 40, { fill: share > 0.55 ? ink.leaf : '#d9d3a0' }), { turn })
    const heads =
      unbent < 0.5
        ? at(46, lift + 10, seedLeaf(168) + seedLeaf(192))
        : at(0, lift - 40, seedLeaf(-open) + seedLeaf(open) + stroke('M0 0V-30', ink.leafLight, 8))
    const crack = stroke(`M-70 4L-30 ${-14 * share}L0 4L40 ${-12 * share}L80 4`, ink.soilWet, 6)
    return at(
      x,
      surface,
      roots(-10, 120, 130) + stroke(hook, '#c9d3a0', 18) + heads + (share > 0.3 && share < 0.7 ? crack : ''),
    )
  })
  return sky(surface - 110) + rect(0, surface - 110, 1280, 126, '#8d7152') + cutting(surface) + beans
}
