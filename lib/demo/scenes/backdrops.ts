import { at, dot, height, ink, many, path, rect, scatter, stroke, sway, width } from './brush'

const hills = (y: number, colour: string) =>
  path(`M0 ${y - 44}C236 ${y - 76} 438 ${y - 32} 690 ${y - 56}S1094 ${y - 76} 1280 ${y - 54}V${y + 30}H0z`, {
    fill: colour,
  })

const cloud = (x: number, y: number, scale: number) =>
  at(x, y, path('M0 40Q-6 14 26 14Q38 -12 72 0Q98 -16 118 12Q150 12 146 40Z', { fill: ink.white, opacity: 0.8 }), {
    scale,
  })

/** Sky and far trees down to `y`. Clouds stand still, so that what moves below repeats frame for frame. */
export function sky(y: number): string {
  return (
    rect(0, 0, width, y + 40, ink.sky) +
    cloud(180, y * 0.22, 1.1) +
    cloud(860, y * 0.14, 0.8) +
    path(`M0 ${y - 62}Q320 ${y - 104} 640 ${y - 74}T1280 ${y - 88}V${y + 20}H0z`, { fill: ink.farTrees }) +
    hills(y, ink.trees)
  )
}

/** A field seen along its rows. `rows` is how many furrows run to the far end. */
export function field(y: number, ground: string = ink.soil, furrow: string = ink.furrow, rows = 9): string {
  const lines = many(rows, (i) => {
    const share = i / (rows - 1) - 0.5
    return `M${Math.round(640 + share * 2600)} ${height}L${Math.round(640 + share * 250)} ${y}`
  })
  return rect(0, y, width, height - y, ground) + stroke(lines, furrow, 15, 0.5)
}

/** The ground cut open: topsoil over subsoil, with crumbs. `surface` is where the air ends. */
export function cutting(surface: number, top: string = ink.soil, below: string = ink.soilDark): string {
  const next = scatter(7)
  const wave = `M0 ${surface}Q160 ${surface - 10} 320 ${surface}T640 ${surface}T960 ${surface}T1280 ${surface}V${height}H0z`
  const deep = surface + 330
  const crumbs = many(110, () => {
    const x = next() * width
    const y = surface + 22 + next() * (height - surface - 30)
    return dot(x, y, 2 + next() * 5, y > deep ? ink.furrow : ink.crumb, { opacity: 0.7 })
  })
  const subsoil = path(`M0 ${deep}Q320 ${deep + 26} 640 ${deep}T1280 ${deep + 6}V${height}H0z`, { fill: below })
  return path(wave, { fill: top }) + subsoil + crumbs
}

/** A work bench by a shed wall: boards behind, planks in front. */
export function bench(y = 430): string {
  const boards = many(9, (i) => `M${i * 150 + 40} 0V${y}`)
  const joints = `M0 ${y + 96}H1280M0 ${y + 200}H1280`
  return (
    rect(0, 0, width, y, ink.paper) +
    stroke(boards, '#d9d5c8', 3) +
    rect(0, y, width, height - y, ink.plank) +
    rect(0, y, width, 18, ink.plankDark) +
    stroke(joints, ink.plankDark, 3, 0.6)
  )
}

/** A plain ground for a thing seen close. */
export function close(colour: string = ink.haze): string {
  return (
    rect(0, 0, width, height, colour) +
    path(`M0 ${height}V590Q320 560 640 584T1280 570V${height}z`, { fill: ink.farTrees, opacity: 0.55 })
  )
}

/** Still water with glints that wander and come back every `period` seconds. */
export function pond(x: number, y: number, w: number, h: number, t: number, period = 4): string {
  const next = scatter(Math.round(x + y))
  const glints = many(Math.max(4, Math.round((w * h) / 9000)), () => {
    const gx = x + 20 + next() * (w - 120)
    const gy = y + 10 + next() * (h - 20)
    return `M${Math.round(gx + sway(t, period, next()) * 12)} ${Math.round(gy)}h${Math.round(24 + next() * 50)}`
  })
  return rect(x, y, w, h, ink.water) + stroke(glints, ink.white, 3, 0.55)
}
