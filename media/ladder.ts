/** Sizes that a film is made in. Caps are kbit/s for H.264 at two seconds of buffer, chosen for rural lines. */
const steps = [
  { short: 144, capKbit: 110 },
  { short: 240, capKbit: 260 },
  { short: 360, capKbit: 500 },
  { short: 480, capKbit: 900 },
  { short: 720, capKbit: 2200 },
  { short: 1080, capKbit: 4500 },
] as const

const offered = [240, 360, 480, 720, 1080]

export type Rung = {
  /** Short side as named to people; for an upright phone film this is its width. */
  height: number
  pixelsWide: number
  pixelsHigh: number
  capKbit: number
  frameRate: Rate
}

/** A frame rate as a fraction, because 29.97 is none. */
export type Rate = { num: number; den: number }
export const perSecond = (rate: Rate): number => rate.num / rate.den

const common: Rate[] = [
  { num: 24000, den: 1001 },
  { num: 24, den: 1 },
  { num: 25, den: 1 },
  { num: 30000, den: 1001 },
  { num: 30, den: 1 },
  { num: 50, den: 1 },
  { num: 60000, den: 1001 },
  { num: 60, den: 1 },
]

/** The nearest rate in common use when it is within 0.4 %, else the whole number; never above 60. */
export function steadyRate(fps: number): Rate {
  const halved = fps > 61 ? fps / Math.ceil(fps / 60.5) : fps
  const near = common.find((rate) => Math.abs(perSecond(rate) / halved - 1) < 0.0004)
  const loose = common.find((rate) => Math.abs(perSecond(rate) / halved - 1) < 0.004)
  return near ?? loose ?? { num: Math.min(60, Math.max(1, Math.round(halved))), den: 1 }
}

/** Small sizes are not worth more than about 30 pictures a second: the bytes are better spent on each. */
function rateFor(height: number, rate: Rate): Rate {
  return height > 480 || perSecond(rate) <= 31 ? rate : { num: rate.num, den: rate.den * 2 }
}

/** A size of its own kind is never larger than what was filmed. */
const evenBelow = (pixels: number) => Math.floor(pixels / 2) * 2
const even = (pixels: number) => Math.max(2, Math.round(pixels / 2) * 2)

function capFor(height: number): number {
  const at = steps.findIndex((step) => step.short >= height)
  const above = steps[at < 0 ? steps.length - 1 : at] ?? steps[0]
  const below = steps[Math.max(0, at - 1)] ?? steps[0]
  if (above.short === below.short) return above.capKbit
  const share = (height - below.short) / (above.short - below.short)
  return Math.round(below.capKbit + share * (above.capKbit - below.capKbit))
}

/** Sizes by short side, none above the source, smallest first, always at least two. Width and height are as seen upright. */
export function ladderFor(film: { width: number; height: number; frameRate: number }): Rung[] {
  const short = Math.min(film.width, film.height)
  const heights = offered.filter((height) => height <= short)
  const only = heights[0] ?? 0
  if (heights.length === 0) heights.push(even(short * 0.6), evenBelow(short))
  else if (heights.length === 1 && short >= only * 1.2) heights.push(evenBelow(short))
  else if (heights.length === 1) heights.unshift(even(only * 0.6))
  const source = steadyRate(film.frameRate)
  return [...new Set(heights)].map((height) => ({
    height,
    pixelsWide: film.width <= film.height ? height : even((film.width / film.height) * height),
    pixelsHigh: film.width <= film.height ? even((film.height / film.width) * height) : height,
    capKbit: capFor(height),
    frameRate: rateFor(height, source),
  }))
}
