import { bench, cutting, sky } from './backdrops'
import { at, dot, ink, many, oval, path, ramp, rect, scatter, stroke, sway, type Scene } from './brush'
import { label, letters } from './lettering'
import { pulling } from './machines'
import { kernel, roots } from './plants'

/** Kernels are laid out in rows of ten beside the scale; its pan goes down when the weight is said. */
export const kernels: Scene = ({ t, line, since }) => {
  const laid = Math.min(60, Math.floor(t * 7))
  const next = scatter(5)
  const turns = Array.from({ length: 60 }, () => next() * 40 - 20)
  const rows = many(laid, (i) => kernel(150 + (i % 10) * 46, 500 + Math.floor(i / 10) * 34, turns[i] ?? 0))
  const weighed = line >= 1 ? ramp(line === 1 ? since : 9, 0, 1.5) : 0
  const pan = 250 + weighed * 34
  const heap = many(34, (i) => kernel(860 + ((i * 37) % 150), pan - 12 - ((i * 13) % 34), (i * 47) % 180))
  const scale =
    stroke(`M940 520V${pan + 40}`, ink.iron, 20) +
    (line >= 1 ? heap : '') +
    path(`M800 ${pan - 8}H1080L1050 ${pan + 40}H830Z`, { fill: ink.ironLight }) +
    path('M830 600L860 460H1020L1050 600Z', { fill: ink.iron }) +
    dot(940, 530, 44, ink.paper) +
    stroke(`M940 530L${940 + Math.sin(weighed * 2 - 1) * 34} ${530 - Math.cos(weighed * 2 - 1) * 34}`, ink.mark, 5)
  const sheet = rect(104, 462, 520, 236, ink.paper)
  return bench() + sheet + rows + scale + sack(300, 430) + (line >= 1 && weighed > 0.9 ? label(1086, 300, '38 g') : '')
}

const sack = (x: number, y: number) =>
  at(
    x,
    y,
    path('M-110 0Q-130 -140 -84 -236H84Q128 -140 110 0Z', { fill: '#c9b28c' }) +
      path('M-84 -236Q-40 -262 0 -244T84 -236L60 -208H-60Z', { fill: '#a98f66' }) +
      stroke('M-60 -80H60M-60 -104H60', '#a98f66', 6) +
      wheatMark(),
  )

const wheatMark = () =>
  stroke(
    'M0 -120V-180M0 -130q-16 -6 -20 -24M0 -130q16 -6 20 -24M0 -150q-14 -6 -16 -22M0 -150q14 -6 16 -22',
    ink.brown,
    5,
  )

/** The sum is chalked on the shed door a line at a time; each line appears with its sentence. */
export const sumBoard: Scene = ({ line, since }) => {
  const chalk = '#e9ece6'
  const rows: [number, string][] = [
    [0, '30 × 38 ÷ 0.94'],
    [1, '÷ 10 = 121'],
    [2, '÷ 10.413'],
    [3, '= 116.5'],
  ]
  const written = rows.map(([from, text], i) => {
    const shown = line > from ? text : line === from ? text.slice(0, Math.floor(since * 9)) : ''
    return letters(330, 150 + i * 108, 46, shown, chalk)
  })
  const struck = line >= 3 ? stroke('M316 282H846', ink.mark, 7) : ''
  const boards = many(11, (i) => stroke(`M${i * 128 + 10} 0V720`, ink.plankDark, 5, 0.7))
  const board = rect(230, 70, 820, 520, ink.plate) + stroke('M230 70H1050V590H230Z', ink.plankDark, 22)
  return (
    rect(0, 0, 1280, 720, ink.plank) +
    boards +
    board +
    written.join('') +
    struck +
    rect(560, 606, 190, 16, ink.plankDark) +
    rect(600, 594, 60, 12, chalk)
  )
}

/** The drill crosses, seeds lie at one depth behind it and the slot is closed. */
export const drillPass: Scene = ({ t, of }) => {
  const x = 40 + (t / of) * 1300
  const seeds = many(52, (i) => {
    const sx = i * 26 + 6
    if (sx > x - 180) return ''
    return stroke(`M${sx} 404v92`, ink.soilDark, 5, 0.6) + at(sx, 500, oval(0, 0, 9, 6, { fill: ink.straw }))
  })
  const falling = many(6, (i) => dot(x - 372 + i * 38, 410 + ((t * 90 + i * 21) % 80), 5, ink.straw))
  return sky(280) + rect(0, 280, 1280, 136, '#8d7152') + cutting(400) + seeds + falling + pulling(x, 400, t, 'drill')
}

/** Coleoptiles rise from seed depth and open a leaf; a warm sun climbs with them. */
export const emergence: Scene = ({ t, of }) => {
  const surface = 380
  const grown = ramp(t, 0, of * 0.75)
  const plants = many(8, (i) => {
    const x = 120 + i * 150
    const late = ((i * 5) % 8) / 22
    const share = ramp(grown, late, late + 0.62)
    const tip = 176 - share * 290
    const lean = sway(t, 3, i / 8) * 5 * share
    const leaf =
      share > 0.75 ? stroke(`M0 ${tip}q${14 + lean} -44 ${48 * (share - 0.5) * 2} ${-50 + lean}`, ink.leaf, 11) : ''
    const sheath = stroke(`M0 168Q-4 60 ${lean / 2} ${tip}`, share > 0.6 ? ink.leafLight : '#e4e2c4', 13)
    return at(
      x,
      surface,
      roots(0, 178, 40 + 90 * share) +
        leaf +
        sheath +
        oval(0, 176, 20, 12, { fill: ink.straw }) +
        stroke('M-12 176H12', ink.brown, 3),
    )
  })
  const sun = dot(1080, 190 - grown * 90, 54, '#eed9a0')
  return sky(surface - 90) + sun + rect(0, surface - 90, 1280, 106, '#8d7152') + cutting(surface) + plants
}
