import { bench, field, sky } from './backdrops'
import { at, dot, ink, many, oval, path, ramp, rect, scatter, stroke, sway, type Scene } from './brush'
import { label } from './lettering'
import { roots, tuft } from './plants'

/** Where the plants of the Long Field stand: nearer ones larger, all along the rows. */
function plantsOfField(colour: (y: number) => string, t = 0): string {
  const next = scatter(19)
  return [268, 300, 344, 404, 480, 580]
    .map((y) => {
      const size = 0.3 + (y - 250) / 300
      return many(9, (i) => {
        const x = 640 + (i - 4 + (next() - 0.5) * 0.6) * (70 + (y - 250) * 0.72)
        return tuft(x, y + next() * 26, size, colour(y), sway(t, 2, next()) * 2)
      })
    })
    .join('')
}

/** Early light, frost on the clods and brown tips; a thermometer stands at crown depth. */
export const frostField: Scene = ({ t, line, since }) => {
  const next = scatter(31)
  const rime = many(90, () => dot(next() * 1280, 250 + next() * 460, 2 + next() * 3, ink.white, { opacity: 0.75 }))
  const tips = plantsOfField((y) => (y > 400 ? '#7d8a4a' : ink.leaf), t)
  const reads = line >= 1
  const column = 120 - (reads ? 40 * ramp(line === 1 ? since : 9, 0, 2) : 0)
  const glass =
    rect(-30, -260, 60, 250, ink.paper, { stroke: ink.ironDark, width: 5 }) +
    stroke(
      many(9, (i) => `M-18 ${-236 + i * 24}h${i % 2 ? 12 : 20}`),
      ink.ironDark,
      3,
    ) +
    stroke(`M12 -30V${-30 - column}`, ink.waterDeep, 12) +
    dot(12, -30, 13, ink.waterDeep) +
    stroke('M0 -8V64', ink.iron, 12)
  const dawn = rect(0, 74, 1280, 40, '#efdcc6', { opacity: 0.6 })
  return (
    sky(210) +
    dawn +
    field(210) +
    tips +
    rime +
    at(930, 560, glass) +
    (reads && (line > 1 || since > 2) ? label(990, 330, '31 °F') : '')
  )
}

const besideTheHoop = many(12, (i) =>
  tuft(
    [60, 190, 300, 980, 1090, 1210, 420, 820, 120, 1160, 520, 720][i] ?? 0,
    [640, 470, 400, 420, 560, 680, 340, 330, 330, 360, 300, 290][i] ?? 0,
    [1.1, 0.8, 0.6, 0.6, 0.9, 1.2, 0.45, 0.45, 0.45, 0.5, 0.38, 0.36][i] ?? 1,
  ),
)

/** The nineteen; those that are counted carry a dot. */
function inTheHoop(t: number, counted: number): string {
  const next = scatter(77)
  return many(19, (i) => {
    const angle = i * 2.4
    const reach = Math.sqrt((i + 0.6) / 19.5)
    const px = 650 + Math.cos(angle) * reach * 236
    const py = 550 + Math.sin(angle) * reach * 84
    return (
      tuft(px, py, 0.84 + next() * 0.2, ink.leaf, sway(t, 2, i / 19) * 2) +
      (i < counted ? dot(px, py + 5, 8, ink.white) : '')
    )
  })
}

/** The hoop flies in over the shoulder, lands, and the plants inside are ticked off. */
export const hoop: Scene = ({ t, line, since }) => {
  const thrown = line === 0 ? ramp(t, 3.4, 5.2) : 1
  const x = 1420 - 770 * thrown
  const y = 534 - Math.sin(thrown * Math.PI) * 330
  const flat = 0.38 + 0.5 * Math.abs(Math.sin(thrown * Math.PI * 2)) * (thrown < 1 ? 1 : 0)
  const ring = (colour: string, line: number) => oval(x, y, 283, 283 * flat, { stroke: colour, width: line })
  const counted = line === 0 ? 0 : line === 1 ? Math.floor(since * 12) : 19
  return (
    sky(210) +
    field(210) +
    besideTheHoop +
    inTheHoop(t, counted) +
    ring(ink.white, 15) +
    ring(ink.mark, 5) +
    (counted >= 19 ? label(770, 334, '19 in the hoop') : '')
  )
}

const cuttingBoard = rect(220, 300, 840, 290, '#cdb48c') + rect(220, 590, 840, 22, ink.plankDark)

const halfCrown = (side: number, apart: number, flesh: string) =>
  at(
    side * 190 * apart,
    0,
    path(`M0 -10Q${side * 74} 0 ${side * 70} 70Q${side * 56} 130 0 140Z`, {
      fill: flesh,
      stroke: '#a58a5a',
      width: 7,
    }) +
      stroke(
        `M${side * 24} -6Q${side * 30} -120 ${side * 86} -210M${side * 40} 6Q${side * 90} -90 ${side * 170} -130M${side * 8} -10Q${side * 8} -140 ${side * 20} -240`,
        ink.leaf,
        17,
      ) +
      roots(side * 26, 138, 90) +
      (apart > 0.9
        ? stroke(`M${side * 22} 20Q${side * 44} 60 ${side * 24} 116`, side < 0 ? '#cfe0b4' : '#6b4a2c', 9)
        : ''),
  )

const knife = (y: number) =>
  at(640, y, path('M-16 0H16V240L0 300L-16 240Z', { fill: ink.ironLight }) + rect(-22, -150, 44, 156, ink.ironDark))

/** A crown on the board: the knife comes down, the halves part, one white and one brown. */
export const crown: Scene = ({ t, line, since }) => {
  const cut = line === 0 ? ramp(t, 2, 4) : 1
  const apart = line === 0 ? ramp(t, 4, 5) : 1
  const shadeOf = (side: number) => (line === 1 && side < 0 ? 1 : line === 2 && side > 0 ? 1 : 0)
  const glow = (side: number) =>
    shadeOf(side)
      ? oval(640 + side * 214, 400, 150, 170, {
          stroke: ink.mark,
          width: 6,
          dash: '14 16',
          opacity: 0.5 + 0.4 * Math.abs(sway(since, 3)),
        })
      : ''
  return (
    bench(250) +
    cuttingBoard +
    at(
      640,
      350,
      halfCrown(-1, apart, '#f1efdd') + halfCrown(1, apart, line === 0 && apart < 0.9 ? '#f1efdd' : '#9b7748'),
    ) +
    (apart < 1 ? knife(-140 + cut * 330 - apart * 320) : '') +
    glow(-1) +
    glow(1)
  )
}

const throws = [
  [170, 600],
  [260, 250],
  [360, 560],
  [460, 220],
  [560, 570],
  [670, 230],
  [770, 580],
  [880, 240],
  [980, 560],
  [1090, 250],
]
const greenRows = many(24, (i) => stroke(`M${70 + i * 48} 130L${100 + i * 48} 680`, ink.leaf, 9, 0.75))
const wetCorner = path('M880 690Q900 560 1010 560T1200 640L1190 690Z', { fill: ink.water })

/** The field from above: ten throws along a zigzag, one bare wet corner. */
export const zigzag: Scene = ({ t, line, since }) => {
  const walked = Math.min(9.99, t * 1.1)
  const whole = Math.floor(walked)
  const d = throws
    .slice(0, whole + 1)
    .map(([x, y], i) => `${i ? 'L' : 'M'}${x} ${y}`)
    .join('')
  const [ax = 0, ay = 0] = throws[whole] ?? []
  const [bx = ax, by = ay] = throws[whole + 1] ?? []
  const now = `L${Math.round(ax + (bx - ax) * (walked - whole))} ${Math.round(ay + (by - ay) * (walked - whole))}`
  const rings = throws
    .slice(0, whole + 1)
    .map(([x = 0, y = 0]) => dot(x, y, 22, ink.white, { stroke: ink.mark, width: 6 }))
    .join('')
  const said = line >= 1 && (line > 1 || since > 3) ? label(424, 40, '827,640 an acre') : ''
  return (
    rect(0, 0, 1280, 720, ink.haze) +
    path('M50 120H1180L1236 694H70Z', { fill: ink.soil }) +
    greenRows +
    wetCorner +
    path(d + now, { stroke: ink.white, width: 6, dash: '4 18' }) +
    rings +
    said
  )
}
