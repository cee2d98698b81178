import '@/models/associations'
import { Term } from '@/models/term'
import { markTerms } from './rules'
import { explainerNote, type LoadedExplainer } from './state-of'
import type { Mention, TermNote } from './views'

export type LoadedTerm = Term & { explainer: LoadedExplainer | null }

export const WITH_EXPLAINER = [{ association: 'explainer', include: ['claims'] }]

export const termNote = ({ slug, label, definition, explainer }: LoadedTerm): TermNote => ({
  slug,
  label,
  definition,
  explainer: explainer && explainerNote(explainer),
})

/**
 * The terms of what is said, cue by cue, and a note for each term found. Positions in seconds.
 * `chapters` tell meanings apart by their crops; each term is marked once in each.
 */
export async function spokenTerms(
  cues: Parameters<typeof markTerms>[0],
  chapters: Parameters<typeof markTerms>[1],
): Promise<{ mentions: Mention[][]; notes: TermNote[] }> {
  const terms = await Term.findAll({ order: [['slug', 'asc']] })
  const mentions = markTerms(cues, chapters, terms)
  const slugs = new Set(mentions.flat().map(({ slug }) => slug))
  const found = await Term.findAll({ where: { slug: [...slugs] }, include: WITH_EXPLAINER })
  return { mentions, notes: (found as LoadedTerm[]).map(termNote) }
}
