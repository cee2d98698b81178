import { close } from './backdrops'
import { at, dot, ink, many, oval, path, ramp, rect, stroke, sway, type Scene } from './brush'
import { label } from './lettering'
import { roots, stem } from './plants'

const wall = path('M540 560Q530 270 556 -20H724Q750 270 740 560Q700 610 640 610T540 560Z', { fill: ink.leaf })
const hollow = path('M592 560Q586 270 602 -20H678Q694 270 688 560Q660 580 640 580T592 560Z', { fill: '#e9efd3' })
const plate = (y: number, colour: string) =>
  path(`M590 ${y - 13}Q640 ${y - 25} 690 ${y - 13}V${y + 13}Q640 ${y + 2} 590 ${y + 13}Z`, { fill: colour })
const rule = at(
  820,
  560,
  rect(0, -480, 96, 500, ink.paper) +
    stroke(
      many(26, (i) => `M0 ${-i * 19}h${i % 10 === 0 ? 62 : i % 5 ? 22 : 40}`),
      ink.ironDark,
      3,
    ),
)

/** A slit stem beside a rule: the first node rises to its centimetre, the young head above it. */
export const firstNode: Scene = ({ t, line, since }) => {
  const risen = line === 0 ? 0.2 + ramp(t, 1, 4) * 0.3 : line === 1 ? 0.5 + 0.5 * ramp(since, 0, 4) : 1
  const node = 560 - 190 * risen
  const young = at(
    640,
    node - 40,
    path('M0 -70Q22 -30 12 0H-12Q-22 -30 0 -70Z', { fill: ink.leafLight }) +
      stroke('M-8 -14H8M-9 -30H9M-6 -46H6', ink.leafDark, 3),
    { scale: line >= 2 ? 1.25 : 1 },
  )
  const reach = line >= 1 ? stroke(`M770 560V370M754 560H786M754 370H786`, ink.mark, 5) + label(936, 420, '1 cm') : ''
  const wind = sway(t, 3) * 8
  const side = path(
    `M546 380Q450 250 ${340 + wind} 130Q410 320 542 450ZM732 300Q770 190 ${768 - wind} 60Q806 220 736 380Z`,
    { fill: ink.leafDark },
  )
  return (
    close() +
    side +
    wall +
    hollow +
    plate(560, ink.leafDark) +
    plate(node, ink.leafDark) +
    young +
    roots(640, 604, 96) +
    rule +
    reach
  )
}

/** One plant, five tillers: two are brown. Green ones are ringed, then the brown ones fall away. */
export const tillers: Scene = ({ t, line, since }) => {
  const brown = (i: number) => i === 1 || i === 3
  const drop = line >= 2 ? ramp(line === 2 ? since : 9, 1, 4) : 0
  const shoots = many(5, (i) => {
    const turn = (i - 2) * 17 + sway(t, 3, i / 5) * 1.5
    const fall = brown(i) ? drop * (i < 2 ? -42 : 42) : 0
    return at(0, 0, stem(0, 0, 330 - Math.abs(i - 2) * 40, brown(i) ? ink.brown : ink.leaf, 8), { turn: turn + fall })
  })
  const crownGlow =
    line === 1 ? oval(640, 548, 104, 74, { stroke: ink.mark, width: 7, opacity: 0.6 + 0.4 * Math.abs(sway(t, 2)) }) : ''
  const soilLine = path('M0 560Q320 548 640 560T1280 556V720H0Z', { fill: ink.soil })
  const bulb = oval(640, 552, 62, 40, { fill: '#f1efdd', stroke: '#a58a5a', width: 6 })
  const fresh =
    line >= 1
      ? stroke(
          'M600 540q-30 -46 -24 -96M684 540q30 -40 34 -88',
          ink.leafLight,
          12 * (line === 1 ? ramp(since, 1, 3) : 1) + 0.1,
        )
      : ''
  return close() + at(640, 545, shoots, { scale: 1.25 }) + soilLine + roots(640, 580, 110) + bulb + fresh + crownGlow
}

/** Narrow rows from above: the ring falls on them, then a stick is laid along one row. */
export const twoHoops: Scene = ({ t, line, since }) => {
  const rows = many(9, (i) => {
    const y = 110 + i * 68
    return (
      stroke(`M0 ${y}H1280`, ink.furrow, 16, 0.5) +
      many(22, (k) =>
        stroke(
          `M${20 + k * 60 + ((i * 23) % 40)} ${y}q-12 -16 -22 -10m22 10q2 -22 6 -26m-6 26q12 -14 24 -10`,
          ink.leaf,
          6,
        ),
      )
    )
  })
  const ringIn = line >= 1 ? ramp(line === 1 ? since : 9, 0, 1.5) : 0
  const ring =
    dot(420, 370, 123, 'none', { stroke: ink.white, width: 13, opacity: ringIn }) +
    dot(420, 370, 123, 'none', { stroke: ink.mark, width: 5, opacity: ringIn })
  const across = line === 1 && since > 2 ? stroke('M297 370H543', ink.white, 5) + label(300, 510, '13.5 in') : ''
  const laid = line >= 2 ? ramp(line === 2 ? since : 9, 0, 1.4) : 0
  const stick =
    laid > 0
      ? at(960, 382 - (1 - laid) * 200, rect(-87, -9, 174, 18, ink.paper, { stroke: ink.ironDark, width: 3 }))
      : ''
  const along = line >= 3 && since > 2 ? label(830, 430, '19.2 in') : ''
  return rect(0, 0, 1280, 720, ink.soil) + rows + at(0, sway(t, 4) * 0.5, ring) + across + stick + along
}
