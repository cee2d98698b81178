/** Words that say nothing about what is asked. From memory: the commonest of English questions. */
const COMMON = new Set(
  'a an and are as at be but by can could do does for from get had has have how i if in is it its me my of on or our should so than that the their them then there this to too was we were what when where which who why will with would you your'.split(
    ' ',
  ),
)

const wordsOf = (text: string) =>
  (text.toLowerCase().match(/[\p{L}\p{N}]+/gu) ?? []).filter((word) => !COMMON.has(word))

/** "beans" and "bean", "rolling" and "roll": the same word as long as four letters or the shorter whole agree. */
const sameWord = (a: string, b: string) => {
  const shorter = Math.min(a.length, b.length)
  return a === b || (shorter >= 4 && a.slice(0, shorter) === b.slice(0, shorter))
}

/** Which share of the telling words of one text stands in another, 0 to 1 with two decimals. */
export function shareOfWords(asked: string, text: string): number {
  const sought = [...new Set(wordsOf(asked))]
  const there = [...new Set(wordsOf(text))]
  const found = sought.filter((word) => there.some((other) => sameWord(word, other)))
  return sought.length === 0 ? 0 : Math.round((found.length / sought.length) * 100) / 100
}
