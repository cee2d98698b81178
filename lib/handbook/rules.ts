import type { Basis, ClaimEntry, Verdict } from './entries'
import type { ExplainerState, Mention } from './views'

export { markTerms } from './mentions'

/** Checks are due again after a year. */
const checkHoldsYears = 1

type Judged = { verdict: 'agrees' | 'differs' | 'not found' | null }

/** The date on which a check stops holding: the same day a year later (1 March after a 29 February). */
function dueOn(checkedOn: string): Date {
  const due = new Date(checkedOn)
  due.setUTCFullYear(due.getUTCFullYear() + checkHoldsYears)
  return due
}

/**
 * Where an explainer stands.
 * `claims` with their verdicts; `changes` names what was changed since the check (claim keys, "text"); `checkedOn` is
 * the ISO date on which the last claim was settled, null if that never happened.
 * Only a claim that agrees is settled: one that differs or is not found asks for an amendment first.
 */
export function explainerState(
  claims: readonly Judged[],
  changes: readonly string[],
  checkedOn: string | null,
  now: Date,
): ExplainerState {
  if (checkedOn && (changes.length > 0 || now >= dueOn(checkedOn))) return 'due'
  if (checkedOn && claims.every(({ verdict }) => verdict === 'agrees')) return 'checked'
  return claims.some(({ verdict }) => verdict !== null) ? 'in check' : 'draft'
}

const publications = (count: number) => (count === 1 ? '1 publication' : `${count} publications`)

/** How far an explainer was checked, in the words of the ruled sheet. `sources` counts publications held against. */
export function checkWords({ state, sources }: { state: ExplainerState; sources: number }): string {
  if (state === 'checked') return `Checked against ${publications(sources)}`
  if (state === 'due') return 'Due to be checked again'
  if (state === 'draft' || sources === 0) return 'Not checked yet'
  return `Being checked, so far against ${publications(sources)}`
}

const unchecked: Record<Basis, string> = {
  'publication opened': 'Read in the publication, not judged yet',
  'as transcribed elsewhere': 'As transcribed elsewhere; the publication itself is still to be opened',
  'worked out': 'Worked out from the published formula',
  'from memory': 'From memory; no publication opened yet',
  'common practice': 'Common practice, no source',
}

const judged: Record<Verdict, string> = {
  agrees: 'Agrees with the publication',
  differs: 'Differs from the publication',
  'not found': 'Not found in the publication',
}

/** What may be said of a claim: the verdict once somebody gave one, before that how the figure came here. */
export const claimWords = ({ verdict, basis }: Pick<ClaimEntry, 'verdict' | 'basis'>): string =>
  verdict ? judged[verdict] : (unchecked[basis] ?? unchecked['from memory'])

/** A source's address if a browser may open it. What people type into the field is not trusted to be a link. */
export const openable = (url: string | null): string | null => (url && /^https?:\/\//i.test(url) ? url : null)

const number = new Intl.NumberFormat('en-US', { maximumFractionDigits: 6 })

/** A claim's figure with its unit: "100–120 GDD", "11.24 %"; null for a claim without one. */
export function figure({ low, high, unit }: Pick<ClaimEntry, 'low' | 'high' | 'unit'>): string | null {
  const ends = [low, high].filter((end) => end !== null)
  if (ends.length === 0) return null
  const figures = [...new Set(ends)].map((end) => number.format(end)).join('–')
  // A figure and its unit stay on one line (NIST SP 811, 7.2 asks for the space).
  return unit ? `${figures}\u00a0${unit}` : figures
}

const escapeMarkdown = (text: string) => text.replace(/[\\`*_[\]<>|~]/g, '\\$&')

const claimToken = /\{\{claim:([a-z0-9-]+)\}\}/g

/** The claims that a body names, in order, each once. */
export function claimKeys(body: string): string[] {
  return [...new Set(Array.from(body.matchAll(claimToken), (match) => match[1] ?? ''))]
}

/** The id of a claim's row on the page; figures in the text lead there. */
export const claimAnchor = (key: string) => `claim-${key}`

/**
 * Sets each `{{claim:key}}` of a Markdown body to that claim's figure, as a link to its row.
 * A key without a claim, or a claim without a figure, shows as a gap in words rather than as a wrong number.
 */
export function weaveClaims(
  body: string,
  claims: readonly Pick<ClaimEntry, 'key' | 'low' | 'high' | 'unit'>[],
): string {
  const byKey = new Map(claims.map((claim) => [claim.key, claim]))
  return body.replace(claimToken, (_, key: string) => {
    const claim = byKey.get(key)
    const text = claim ? figure(claim) : null
    return text === null ? '(figure missing)' : `[${escapeMarkdown(text)}](#${claimAnchor(key)})`
  })
}

/** A text cut into plain pieces and terms, in order. Mentions that overlap or fall outside the text are left out. */
export function cutAtMentions(text: string, mentions: readonly Mention[]) {
  const pieces: { from: number; text: string; slug: string | null }[] = []
  let at = 0
  for (const { from, to, slug } of [...mentions].sort((a, b) => a.from - b.from)) {
    if (from < at || to <= from || to > text.length) continue
    if (from > at) pieces.push({ from: at, text: text.slice(at, from), slug: null })
    pieces.push({ from, text: text.slice(from, to), slug })
    at = to
  }
  if (at < text.length) pieces.push({ from: at, text: text.slice(at), slug: null })
  return pieces
}

/** Entries under their first letters, both in the order of a dictionary; case and accents do not part a letter. */
export function byLetter<T extends { label: string }>(terms: readonly T[]): { letter: string; terms: T[] }[] {
  const letterOf = ({ label }: T) => label.normalize('NFD').charAt(0).toUpperCase()
  const groups = new Map<string, T[]>()
  for (const term of [...terms].sort((a, b) => a.label.localeCompare(b.label, 'en'))) {
    groups.set(letterOf(term), [...(groups.get(letterOf(term)) ?? []), term])
  }
  return [...groups].map(([letter, under]) => ({ letter, terms: under }))
}
