import { at, dot, ink, many, path, rect, stroke } from './brush'

/** A wheel that has rolled as far as x says. */
function wheel(x: number, y: number, r: number, turned: number): string {
  const spokes = many(5, (i) => {
    const angle = turned + (i * 2 * Math.PI) / 5
    return `M0 0L${Math.round(Math.cos(angle) * r * 0.56)} ${Math.round(Math.sin(angle) * r * 0.56)}`
  })
  return at(
    x,
    y,
    dot(0, 0, r, ink.ironDark) +
      dot(0, 0, r * 0.62, ink.ironLight) +
      stroke(spokes, ink.ironDark, 6) +
      dot(0, 0, r * 0.16, ink.paper),
  )
}

/** A tractor facing right with its rear axle at x; `y` is the ground. */
function tractor(x: number, y: number): string {
  const turned = x / 70
  return at(
    0,
    0,
    rect(x - 4, y - 214, 108, 104, ink.sky, { stroke: ink.ironDark, width: 9 }) +
      rect(x - 20, y - 228, 142, 16, ink.iron) +
      path(
        `M${x - 30} ${y - 112}H${x + 110}V${y - 144}H${x + 232}Q${x + 246} ${y - 142} ${x + 246} ${y - 126}V${y - 62}H${x - 30}Z`,
        { fill: ink.iron },
      ) +
      stroke(`M${x + 190} ${y - 146}V${y - 206}`, ink.ironDark, 10) +
      stroke(`M${x + 130} ${y - 116}H${x + 226}M${x + 130} ${y - 96}H${x + 226}`, ink.ironLight, 5) +
      wheel(x + 20, y - 76, 78, turned) +
      wheel(x + 206, y - 46, 48, turned * 1.6),
  )
}

const cultivator = (x: number, y: number) =>
  stroke(`M${x - 60} ${y - 64}H${x - 330}`, ink.iron, 15) +
  many(5, (i) => stroke(`M${x - 110 - i * 50} ${y - 60}q-30 26 -6 62q6 16 -16 22`, ink.ironDark, 9)) +
  path(`M${x - 338} ${y - 92}h60v26h-60z`, { fill: ink.ironLight })

const drill = (x: number, y: number) =>
  stroke(`M${x - 60} ${y - 58}H${x - 130}`, ink.iron, 12) +
  path(`M${x - 400} ${y - 190}H${x - 120}L${x - 150} ${y - 92}H${x - 370}Z`, { fill: ink.waterDeep }) +
  rect(x - 408, y - 202, 296, 18, ink.iron) +
  many(6, (i) => stroke(`M${x - 356 + i * 38} ${y - 92}q-6 50 -16 92`, ink.ironDark, 7)) +
  many(6, (i) => dot(x - 376 + i * 38, y - 12, 17, ink.ironLight, { stroke: ink.ironDark, width: 5 }))

/** A tractor that pulls a tool over ground at height `y`, its rear axle at x. */
export function pulling(x: number, y: number, t: number, tool: 'cultivator' | 'drill'): string {
  const shake = Math.round(Math.sin(t * 9)) * 1.5
  return at(0, shake, tractor(x, y) + (tool === 'drill' ? drill(x, y) : cultivator(x, y)))
}

/** A combine facing right, its front axle at x; `y` is the ground. */
export function combine(x: number, y: number, t: number): string {
  const reel = many(6, (i) => {
    const angle = t * 2.6 + (i * Math.PI) / 3
    return `M0 0L${Math.round(Math.cos(angle) * 62)} ${Math.round(Math.sin(angle) * 62)}`
  })
  return (
    path(
      `M${x - 330} ${y - 250}H${x - 20}L${x + 20} ${y - 110}H${x - 300}Q${x - 350} ${y - 130} ${x - 350} ${y - 190}Z`,
      { fill: ink.iron },
    ) +
    rect(x - 290, y - 300, 190, 54, ink.ironLight) +
    path(`M${x - 60} ${y - 330}H${x + 60}L${x + 78} ${y - 196}H${x - 60}Z`, {
      fill: ink.sky,
      stroke: ink.ironDark,
      width: 9,
    }) +
    rect(x - 76, y - 348, 150, 18, ink.ironDark) +
    path(`M${x + 10} ${y - 170}L${x + 150} ${y - 70}L${x + 150} ${y - 30}L${x - 10} ${y - 110}Z`, {
      fill: ink.ironDark,
    }) +
    path(`M${x + 140} ${y - 130}V${y - 20}H${x + 280}L${x + 250} ${y - 34}H${x + 176}V${y - 130}Z`, {
      fill: ink.iron,
    }) +
    at(x + 236, y - 112, stroke(reel, ink.ironDark, 7) + dot(0, 0, 62, 'none', { stroke: ink.ironDark, width: 6 })) +
    wheel(x - 10, y - 78, 80, x / 70) +
    wheel(x - 270, y - 48, 50, x / 44)
  )
}
