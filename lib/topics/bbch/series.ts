/** Two-digit codes of one crop, each with its label. A code that the published key does not list is not here. */
export type StageTable = Record<string, string>

/** The run of codes that a key prints as "stages continuous till …"; `n` is the second digit. */
export function series(from: number, to: number, label: (n: number) => string): StageTable {
  const codes = Array.from({ length: to - from + 1 }, (_, i) => from + i)
  return Object.fromEntries(codes.map((code) => [String(code).padStart(2, '0'), label(code % 10)]))
}

const tenths = (n: number) => `${n * 10} %`

/** A run that counts in tenths of the field or the plant: 31 is 10 %, 32 is 20 %. */
export function tenthSeries(from: number, to: number, label: (share: string) => string): StageTable {
  return series(from, to, (n) => label(tenths(n)))
}
