import { bench, pond } from './backdrops'
import { at, dot, ink, many, oval, path, ramp, rect, scatter, stroke, sway, type Scene } from './brush'
import { label } from './lettering'
import { tuft } from './plants'

const ridge = (d: string, colour: string) => path(d, { fill: colour })

/** The basin, its water once it is filled, and the bank below it. */
function terrace(i: number, t: number, of: number): string {
  const y = 212 + i * 57
  const filled = ramp(t, 0.5 + i * (of / 13), 2.5 + i * (of / 13))
  const left = 436 - i * 50
  const right = 884 + i * 46
  const basin = `M${left} ${y}Q640 ${y - 34} ${right} ${y}L${right + 28} ${y + 32}Q640 ${y + 4} ${left - 28} ${y + 32}Z`
  const bank = `M${left - 28} ${y + 31}Q640 ${y + 3} ${right + 28} ${y + 31}L${right + 46} ${y + 59}Q640 ${y + 30} ${left - 46} ${y + 59}Z`
  const glint =
    filled > 0.8
      ? stroke(
          `M${480 + sway(t, 4, i / 6) * 14 - i * 20} ${y + 2}h${80 + i * 12}M${760 + i * 20 + sway(t, 4, i / 5) * 12} ${y + 10}h60`,
          ink.white,
          4,
          0.6,
        )
      : ''
  return (
    path(basin, { fill: ink.soilDark }) +
    path(basin, { fill: ink.water, opacity: Math.round(filled * 10) / 10 }) +
    glint +
    path(bank, { fill: i % 2 ? '#7f9a5c' : '#8aa566' })
  )
}

/** Terraces down a hillside fill one after another, the top one first. */
export const terraces: Scene = ({ t, of }) => {
  const steps = many(9, (i) => terrace(i, t, of))
  const stream = stroke(`M700 120Q660 150 690 180T660 226`, ink.waterDeep, 14)
  return (
    rect(0, 0, 1280, 720, ink.sky) +
    ridge('M0 260Q260 60 520 150T900 90T1280 220V720H0Z', ink.farTrees) +
    ridge('M60 720Q240 190 640 140T1240 720Z', ink.trees) +
    stream +
    steps
  )
}

const lower = path('M760 566H1280V640H700Z', { fill: ink.water })
const bank =
  path('M430 540L540 300H720L850 600V720H330Z', { fill: ink.soil }) +
  path('M524 330L540 300H720L740 346Q630 322 524 330Z', { fill: '#7f9a5c' })
const gap = rect(560, 330, 90, 210, ink.soilWet)
const apron = path('M552 540H664L810 602V720H552Z', { fill: ink.plankDark })
const theLevee =
  lower + path('M0 540H440V720H0Z', { fill: ink.soilDark }) + rect(700, 636, 580, 84, ink.soilDark) + bank + gap + apron
const gateFrame =
  rect(546, 250, 18, 296, ink.plankDark) +
  rect(646, 250, 18, 296, ink.plankDark) +
  rect(546, 244, 118, 18, ink.plankDark)
const staff =
  rect(300, 280, 30, 262, ink.white) +
  stroke(
    many(9, (i) => `M300 ${300 + i * 26}h${i % 2 ? 14 : 22}`),
    ink.mark,
    4,
  )
const beyond =
  rect(0, 0, 1280, 300, ink.sky) +
  path('M0 260Q300 150 620 210T1280 170V340H0Z', { fill: ink.trees }) +
  rect(0, 300, 1280, 420, '#8aa566')

const heldWater = (level: number, t: number) =>
  path(`M0 ${level}H560V540H0Z`, { fill: ink.water }) +
  stroke(
    `M${60 + sway(t, 3) * 16} ${level + 26}h90M${260 + sway(t, 3, 0.4) * 16} ${level + 48}h70M${420 - sway(t, 3) * 10} ${level + 20}h60`,
    ink.white,
    4,
    0.6,
  )

/** A board is lifted out of the gate and the water comes through; the level falls to the mark. */
export const leveeGate: Scene = ({ t, of, line, since }) => {
  const lifted = ramp(t, 1.4, 4) * 96
  const level = 356 + ramp(t, 3, of * 0.8) * 34
  const flow = lifted > 12
  const spray = flow
    ? many(9, (i) => dot(760 + ((t * 70 + i * 31) % 130), 560 + ((i * 19) % 24), 6, ink.white, { opacity: 0.8 }))
    : ''
  const jet = flow
    ? path(`M562 ${540 - lifted * 0.3}H650Q700 ${536 - lifted * 0.2} 800 572V600L664 546H562Z`, { fill: ink.waterDeep })
    : ''
  const board =
    rect(562, 380 - lifted, 86, 160, ink.plank) +
    stroke(`M562 ${430 - lifted}h86M562 ${486 - lifted}h86`, ink.plankDark, 4)
  return (
    beyond +
    heldWater(level, t) +
    theLevee +
    jet +
    gateFrame +
    board +
    staff +
    spray +
    (line >= 1 && (line > 1 || since > 1) ? label(350, 200, '5 cm') : '')
  )
}

const tub =
  path('M150 420H590L550 640H190Z', { fill: ink.iron }) + path('M176 440H564L552 500H188Z', { fill: ink.waterDeep })
const tray = rect(750, 430, 440, 230, ink.ironDark)

/** `sprout` from 0 to 1 is how far its root tip shows. */
function soakedSeed(i: number, sprout: number): string {
  const x = 800 + (i % 5) * 84
  const y = 470 + Math.floor(i / 5) * 66
  const root = stroke(
    `M${x + 24} ${y}q${14 * sprout} ${6 + (i % 3) * 6} ${(10 + (i % 4) * 5) * sprout} ${4 * sprout}`,
    ink.white,
    6 * sprout + 0.1,
  )
  return (
    root +
    at(x, y, oval(0, 0, 27, 12, { fill: '#d2b878' }) + stroke('M-18 -3Q0 -9 18 -3', '#a98f55', 3), {
      turn: ((i * 29) % 30) - 15,
    })
  )
}

const sack = (y: number) =>
  at(
    370,
    y,
    path('M-120 190Q-150 40 -60 0H60Q150 40 120 190Q0 220 -120 190Z', { fill: '#c9b28c' }) +
      stroke('M-60 0Q0 16 60 0M-34 -30Q0 6 34 -30', '#8f7650', 8) +
      stroke('M-90 60q90 26 180 0M-104 116q104 28 208 0', '#b39c74', 4),
  )

/** A sack of seed in the tub: bubbles, then out of the water with root tips showing. */
export const seedSoak: Scene = ({ t, line, since }) => {
  const out = line >= 1 ? 1 : 0
  const sprout = line >= 2 ? 1 : line === 1 ? ramp(since, 0.5, 3) : 0
  const bubbles = out
    ? ''
    : many(12, (i) =>
        dot(210 + ((i * 71) % 320), 496 - ((t * 18 + i * 17) % 48), 4 + (i % 3) * 2, ink.white, { opacity: 0.7 }),
      )
  const drips = out ? many(6, (i) => dot(290 + i * 32, 400 + ((t * 120 + i * 53) % 110), 6, ink.waterDeep)) : ''
  return (
    bench(380) +
    sack(300 - out * 130) +
    tub +
    (out ? '' : at(0, 0, path('M184 470Q370 452 556 470L550 500H190Z', { fill: ink.water, opacity: 0.8 }))) +
    bubbles +
    drips +
    tray +
    many(15, (i) => soakedSeed(i, sprout))
  )
}

/** Young rice stands out of the flood; one square foot is framed and counted. */
export const riceSpike: Scene = ({ t, line, since }) => {
  const next = scatter(53)
  const framed = line >= 1 ? ramp(line === 1 ? since : 9, 0, 1.4) : 0
  const spikes = many(54, (i) => {
    const y = 330 + Math.floor(i / 9) * 64 + next() * 26
    const x = 60 + (i % 9) * 142 + next() * 70
    const size = 0.45 + (y - 320) / 420
    const lean = sway(t, 3, next()) * 3
    return stroke(`M${x - 20 * size} ${y + 8}h${40 * size}`, ink.waterDeep, 3, 0.7) + tuft(x, y, size, ink.leaf, lean)
  })
  const inFrame = many(17, (i) =>
    tuft(500 + (i % 6) * 56 + ((i * 31) % 22), 480 + Math.floor(i / 6) * 56, 0.8, ink.leafDark, sway(t, 3, i / 17) * 3),
  )
  const frame =
    path('M450 420H830L900 640H400Z', { fill: ink.water, stroke: ink.white, width: 14, opacity: framed }) +
    path('M450 420H830L900 640H400Z', { stroke: ink.mark, width: 5, opacity: framed })
  const hill = path('M0 280Q260 90 560 190T1280 130V320H0Z', { fill: ink.trees })
  return (
    rect(0, 0, 1280, 300, ink.sky) +
    hill +
    pond(0, 300, 1280, 420, t) +
    spikes +
    (framed > 0.3 ? frame + inFrame : '') +
    (framed > 0.9 && (line > 1 || since > 3.4) ? label(930, 430, '17 plants') : '')
  )
}
