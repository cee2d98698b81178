/**
 * Typing slips between `typed` and `word`: letters added, left out, changed, or two neighbours swapped (optimal string
 * alignment). With `asPrefix`, to the nearest beginning of `word`. Answers `most + 1` when there are more than `most`.
 */
export function slips(typed: string, word: string, most: number, asPrefix: boolean): number {
  if (!asPrefix && Math.abs(typed.length - word.length) > most) return most + 1
  if (typed.length - word.length > most) return most + 1
  const target = asPrefix ? word.slice(0, typed.length + most) : word
  let above: number[] = []
  let row = Array.from({ length: target.length + 1 }, (_, column) => column)
  for (let line = 1; line <= typed.length; line++) {
    const next = nextRow(typed, target, line, row, above)
    if (Math.min(...next) > most) return most + 1
    above = row
    row = next
  }
  return Math.min(asPrefix ? Math.min(...row) : (row.at(-1) ?? 0), most + 1)
}

function nextRow(typed: string, target: string, line: number, row: number[], above: number[]): number[] {
  const next = [line]
  for (let column = 1; column <= target.length; column++) {
    const same = typed[line - 1] === target[column - 1]
    let cost = Math.min((row[column] ?? 0) + 1, (next[column - 1] ?? 0) + 1, (row[column - 1] ?? 0) + (same ? 0 : 1))
    const swapped = typed[line - 1] === target[column - 2] && typed[line - 2] === target[column - 1]
    if (line > 1 && column > 1 && swapped) cost = Math.min(cost, (above[column - 2] ?? 0) + 1)
    next.push(cost)
  }
  return next
}
