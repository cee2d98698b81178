import { close, pond } from './backdrops'
import { at, dot, ink, many, path, ramp, rect, stroke, sway, type Scene } from './brush'
import { label } from './lettering'
import { panicle, panicleLength, roots } from './plants'

const wall = path('M520 640Q500 320 552 -20H728Q780 320 760 640Q700 690 640 690T520 640Z', { fill: ink.leaf })
const inner = path('M574 620Q562 320 598 -20H682Q718 320 706 620Q670 648 640 648T574 620Z', { fill: '#eef0d8' })
const youngPanicle =
  path('M0 -90Q26 -50 16 0H-16Q-26 -50 0 -90Z', { fill: '#f7f4e4', stroke: ink.leafLight, width: 5 }) +
  stroke('M-10 -20q10 -10 20 0M-12 -40q12 -10 24 0M-8 -60q8 -8 16 0', ink.leafLight, 3)
const plates = stroke('M574 600Q640 574 706 600', ink.leafDark, 9)

/** A split stem: the ring of green at its foot, then the panicle of two millimetres. */
export const greenRingScene: Scene = ({ t, line, since }) => {
  const pulse = line === 0 ? 0.4 + 0.6 * Math.abs(sway(t, 2)) : 1
  const ring = path('M572 560Q640 532 708 560V582Q640 554 572 582Z', {
    fill: '#6faa4a',
    opacity: line === 0 && t < 2 ? 0.3 : pulse,
  })
  const grown = line < 2 ? 0.35 : line === 2 ? 0.35 + 0.65 * ramp(since, 0, 2.5) : 1
  const young = line >= 1 ? at(640, 548, youngPanicle, { scale: grown }) : ''
  const wind = sway(t, 3) * 8
  const leaves = path(
    `M526 360Q440 230 ${330 + wind} 96Q392 300 522 450ZM752 330Q840 220 ${952 - wind} 110Q886 280 758 420Z`,
    { fill: ink.leafDark },
  )
  const arrow = line === 0 ? stroke('M900 570H740M764 548L738 570L764 592', ink.mark, 8) : ''
  return (
    close() +
    leaves +
    wall +
    inner +
    plates +
    ring +
    young +
    roots(640, 684, 60) +
    arrow +
    (line >= 2 && (line > 2 || since > 2.4) ? label(820, 440, '2 mm') : '')
  )
}

const ground = 380

const soil =
  rect(0, ground, 1280, 340, ink.soilDark) +
  many(40, (i) => dot((i * 137) % 1280, ground + 24 + ((i * 59) % 300), 4 + (i % 4), ink.furrow))

const standing = (t: number) =>
  many(8, (i) => {
    const x = [60, 180, 300, 430, 860, 980, 1100, 1220][i] ?? 0
    return (
      stroke(
        `M${x} ${ground}q${sway(t, 3, i / 8) * 6} -120 ${12 + sway(t, 3, i / 8) * 10} -250M${x} ${ground}q-30 -90 -62 -150M${x} ${ground}q36 -100 70 -140`,
        ink.leaf,
        11,
      ) + roots(x, ground, 120)
    )
  })

/** The tube in the mud, cut open: the water inside falls below the ground, then the flood returns. */
export const waterTube: Scene = ({ t, of, line, since }) => {
  const back = line >= 2 ? ramp(since, 3, 6) : 0
  const level = ground - 66 + (1 - back) * 210 * ramp(t, 1, of * 0.5)
  const flood =
    back > 0
      ? rect(0, ground - 66 * back, 1280, 66 * back, ink.water)
      : level < ground
        ? rect(0, level, 1280, ground - level, ink.water)
        : ''
  const wet = rect(0, Math.max(level, ground), 1280, 720, ink.soilWet, { opacity: 0.55 })
  const tube =
    rect(560, 240, 160, 400, ink.white, { opacity: 0.92 }) +
    rect(572, Math.max(level, 250), 136, 628 - Math.max(level, 250), ink.waterDeep) +
    stroke('M560 240V640H720V240', ink.ironDark, 8)
  const holes = many(24, (i) => dot(i % 2 ? 560 : 720, ground + 24 + Math.floor(i / 2) * 19, 5, ink.ironDark))
  return (
    rect(0, 0, 1280, ground, ink.haze) +
    path('M0 250Q320 130 640 200T1280 160V380H0Z', { fill: ink.farTrees }) +
    soil +
    wet +
    flood +
    standing(t) +
    tube +
    holes
  )
}

/** The panicle comes out of its sheath to half, then anthers hang from its tip. */
export const panicleScene: Scene = ({ t, line, since }) => {
  const outShare = line === 0 ? 0.15 + 0.4 * ramp(t, 0.5, 5) : line === 1 ? 0.55 + 0.45 * ramp(since, 0, 4) : 1
  const flowering = line >= 1 ? ramp(line === 1 ? since : 9, 1, 5) : 0
  const one = (x: number, scale: number, shift: number) => {
    const lean = 60 + sway(t, 4, shift) * 16
    const anthers = many(Math.floor(10 * flowering), (i) => {
      const share = 1 - i * 0.07
      return dot(
        lean * share * share + (i % 2 ? 30 : -30),
        panicleLength * (1 - outShare - share) - 10 + (i % 3) * 7,
        5,
        '#eee3b0',
      )
    })
    const sheath = path('M-16 420Q-30 120 -13 0H13Q30 120 16 420Z', { fill: ink.leaf })
    const flag = path(`M10 20Q90 -60 ${210 + sway(t, 4, shift) * 10} -60Q110 -20 12 60Z`, { fill: ink.leafDark })
    const low = path('M-12 160Q-130 60 -220 110Q-120 110 -12 210Z', { fill: ink.leafDark })
    return at(x, 300, panicle(0, 30, outShare, lean) + at(0, 30, anthers) + low + flag + sheath, { scale })
  }
  return (
    rect(0, 0, 1280, 720, ink.haze) +
    path('M0 420Q320 300 640 360T1280 320V720H0Z', { fill: ink.farTrees }) +
    pond(0, 600, 1280, 120, t) +
    one(250, 0.8, 0.3) +
    one(1010, 0.85, 0.6) +
    one(620, 1.15, 0)
  )
}
