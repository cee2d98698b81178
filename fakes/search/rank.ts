import type { Lexicon, Place } from './lexicon'
import type { TermHit, TermHits } from './match'
import { FAR } from './words'

/** A step of a ranking rule: `of` steps in all, `at` counted from 1 (worst). */
type Step = { at: number; of: number }

/** A document that answers the first `hits.length` terms of the query, and how well it does by each rule. */
export type Found = { number: number; hits: TermHit[]; steps: Record<string, Step> }

/** Divides each step of the outer rule by the inner one. */
const within = (outer: Step, inner: Step): Step => ({
  at: (outer.at - 1) * inner.of + inner.at,
  of: outer.of * inner.of,
})

type Whole = { terms: TermHits[]; text: string; lexicon: Lexicon }

function nearness(left: Place[], right: Place[]): number {
  let best = FAR
  for (const a of left) {
    for (const b of right) {
      if (a.attribute !== b.attribute) continue
      const step = b.position - a.position
      // The other way round costs one more: "stand count" is nearer to "stand count" than "count stand" is.
      const cost = step > 0 ? step : 1 - step
      if (step !== 0 && cost < best) best = cost
    }
  }
  return best
}

function proximity(hits: TermHit[]): Step {
  const pairs = Math.max(0, hits.length - 1)
  const cost = hits.slice(1).reduce((sum, hit, at) => sum + nearness(hits[at]?.places ?? [], hit.places), 0)
  return { at: pairs * FAR - cost + 1, of: pairs * (FAR - 1) + 1 }
}

function attribute(hits: TermHit[], attributes: number): Step {
  const rank = (hit: TermHit) => Math.min(...hit.places.map((place) => place.attribute))
  const most = hits.length * Math.max(0, attributes - 1)
  return { at: most - hits.reduce((sum, hit) => sum + rank(hit), 0) + 1, of: most + 1 }
}

const FURTHEST = 100

function wordPosition(hits: TermHit[]): Step {
  const first = (hit: TermHit) => Math.min(FURTHEST, ...hit.places.map(({ position }) => position))
  return { at: hits.reduce((sum, hit) => sum + FURTHEST - first(hit), 1), of: hits.length * FURTHEST + 1 }
}

function exactness(found: Omit<Found, 'steps'>, { text, lexicon, terms }: Whole): Step {
  const whole = text !== '' && lexicon.wholes.get(text)?.has(found.number) ? 1 : 0
  return { at: found.hits.filter(({ exact }) => exact).length + whole + 1, of: terms.length + 2 }
}

/** How a document does by every rule, in the rules' own documented terms. */
export function ranked(found: Omit<Found, 'steps'>, whole: Whole): Found {
  const { hits } = found
  const mostTypos = whole.terms.slice(0, hits.length).reduce((sum, term) => sum + term.mostTypos, 0)
  const typos = hits.reduce((sum, hit) => sum + hit.typos, 0)
  const attributeRank = attribute(hits, whole.lexicon.attributes.length)
  const position = wordPosition(hits)
  const steps = {
    words: { at: hits.length, of: whole.terms.length },
    typo: { at: mostTypos - typos + 1, of: mostTypos + 1 },
    proximity: proximity(hits),
    // Documented: `attribute` is the other two in one.
    attribute: within(attributeRank, position),
    attributeRank,
    wordPosition: position,
    exactness: exactness(found, whole),
  }
  return { ...found, steps }
}

/** `words` counts as first among the rules that look at words even where it is left out (documented). */
export function effectiveRules(rules: string[]): string[] {
  if (rules.includes('words')) return rules
  const at = rules.findIndex((rule) => rule !== 'sort' && !rule.includes(':'))
  return at < 0 ? [...rules, 'words'] : [...rules.slice(0, at), 'words', ...rules.slice(at)]
}

/** Between 0 and 1, and 1 where nothing was asked for: each rule divides what the rules before it left undecided. */
export function scoreOf(found: Found, rules: string[]): number {
  if (found.hits.length === 0) return 1
  const steps = rules.flatMap((rule) => found.steps[rule] ?? [])
  const total = steps.reduce(within, { at: 1, of: 1 })
  return total.at / total.of
}
