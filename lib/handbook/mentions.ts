import type { TermForms } from './entries'
import { indexTerms, wordsOf, type FormNode, type Meaning, type Word } from './term-index'
import type { Mention } from './views'

type Said = { start: number; end: number; text: string }
/** A chapter as far as marking needs it; `EpisodeView.chapters` fit as they are. */
type MarkedChapter = { start: number; topics: readonly { crop: string | null }[] }

/** The words of one chapter in the order spoken, each with the cue it belongs to. */
type Stretch = { crops: Set<string>; words: (Word & { cue: number })[] }

/** How far around a mention its neighbours are looked at. */
const neighbours = 12

/** Cues and chapters in order of time. As in the running text, the middle of a cue says whose it is. */
function stretchesOf(cues: readonly Said[], chapters: readonly MarkedChapter[]): Stretch[] {
  const stretches: Stretch[] = [{ crops: new Set(), words: [] }]
  let current = 0
  cues.forEach(({ start, end, text }, cue) => {
    for (let next = chapters[current]; next && next.start <= (start + end) / 2; next = chapters[current]) {
      const crops = next.topics.flatMap(({ crop }) => crop ?? [])
      stretches.push({ crops: new Set(crops), words: [] })
      current += 1
    }
    // One by one: spread into one call, a very long cue overflows the stack.
    for (const word of wordsOf(text)) stretches.at(-1)?.words.push({ ...word, cue })
  })
  return stretches
}

/** All that an entry's context asks has to fit; a chapter that names no crop excludes none. */
function fits({ term, near, notNear, after }: Meaning, { crops, words }: Stretch, from: number, to: number): boolean {
  const wanted = term.context?.crops
  if (wanted && crops.size > 0 && !wanted.some((crop) => crops.has(crop))) return false
  if (after.size > 0 && !after.has(words[from - 1]?.word ?? '')) return false
  let isNear = near.size === 0
  for (let i = Math.max(0, from - neighbours); i < Math.min(words.length, to + neighbours + 1); i += 1) {
    const word = words[i]?.word
    if (word === undefined || (i >= from && i <= to)) continue
    if (notNear.has(word)) return false
    isNear ||= near.has(word)
  }
  return isNear
}

/** Only a space, a line break or one hyphen may stand inside a form: "field, capacity" is not field capacity. */
const joins = (between: string) => /^(?:\s+|[-\u2010\u2011])$/u.test(between)

type Found = { meaning: Meaning; last: number }

/** The longest form that begins at a word and whose meaning fits here. Its depth is bounded by the longest form. */
function longestAt(root: FormNode, stretch: Stretch, cues: readonly Said[], first: number): Found | null {
  let node: FormNode | undefined = root
  let found: Found | null = null
  for (let i = first; ; i += 1) {
    const word = stretch.words[i]
    const before = stretch.words[i - 1]
    const begin = stretch.words[first]
    const text = word && cues[word.cue]?.text
    if (!word || !begin || text === undefined || word.cue !== begin.cue) return found
    if (i > first && before && !joins(text.slice(before.to, word.from))) return found
    node = node.next.get(word.word)
    if (!node) return found
    const isWritten = (spelling: string) => spelling === text.slice(begin.from, word.to).normalize('NFC')
    const meaning = node.meanings.find(
      (each) => (each.spelling === null || isWritten(each.spelling)) && fits(each, stretch, first, i),
    )
    if (meaning) found = { meaning, last: i }
  }
}

/**
 * Finds the terms in what is said: one list per cue, in order, offsets into the cue's text.
 * The longest form wins, over synonyms, regional names and inflections; each term is marked once per chapter; a form
 * with several meanings takes the one that fits the chapter's crops and the neighbouring words, or none. One pass.
 * A form is not sought across two cues: a mark must lie within one text.
 */
export function markTerms(
  cues: readonly Said[],
  chapters: readonly MarkedChapter[],
  terms: readonly TermForms[],
): Mention[][] {
  const root = indexTerms(terms)
  const mentions: Mention[][] = cues.map(() => [])
  for (const stretch of stretchesOf(cues, chapters)) {
    const heard = new Set<string>()
    for (let i = 0; i < stretch.words.length;) {
      const found = longestAt(root, stretch, cues, i)
      const begin = stretch.words[i]
      const end = stretch.words[found?.last ?? i]
      if (found && begin && end && !heard.has(found.meaning.term.slug)) {
        heard.add(found.meaning.term.slug)
        mentions[begin.cue]?.push({ from: begin.from, to: end.to, slug: found.meaning.term.slug })
      }
      i = (found?.last ?? i) + 1
    }
  }
  return mentions
}
