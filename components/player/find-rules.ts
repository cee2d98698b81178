export type Place = { sentence: number; from: number; to: number }

/** One character for one, so that places in the folded text are places in the text. */
const fold = (text: string) =>
  Array.from(text, (letter) => {
    const plain = letter.normalize('NFD').charAt(0).toLowerCase()
    return plain.length === letter.length ? plain : letter
  }).join('')

/** Every place where the words are said, whatever the case and the accents; spaces in the query count as one. */
export function placesOf(sentences: readonly { text: string }[], query: string): Place[] {
  const wanted = fold(query.trim().replace(/\s+/g, ' '))
  if (wanted === '') return []
  return sentences.flatMap(({ text }, sentence) => {
    const places: Place[] = []
    const folded = fold(text)
    for (let from = folded.indexOf(wanted); from !== -1; from = folded.indexOf(wanted, from + wanted.length)) {
      places.push({ sentence, from, to: from + wanted.length })
    }
    return places
  })
}
