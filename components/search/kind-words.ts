import type { SearchKind } from '@/lib/search/schema'

/** One of a kind, as it stands over a result. */
export const kindWord: Record<SearchKind, string> = {
  passage: 'Passage',
  question: 'Question',
  term: 'Term',
  explainer: 'Explainer',
  episode: 'Whole episode',
}

/** Several of a kind, as a choice. */
export const kindWords: Record<SearchKind, string> = {
  passage: 'Passages',
  question: 'Questions',
  term: 'Terms',
  explainer: 'Explainers',
  episode: 'Whole episodes',
}
