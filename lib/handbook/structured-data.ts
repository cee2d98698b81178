import type { TermView } from './views'

/** A term as schema.org's DefinedTerm. `baseUrl` is the address of this installation. */
export function definedTerm(term: TermView, baseUrl: string) {
  const at = (path: string) => new URL(path, baseUrl).href
  const names = [...term.synonyms, ...term.regional.map(({ name }) => name)]
  return {
    '@context': 'https://schema.org',
    '@type': 'DefinedTerm',
    '@id': at(term.url),
    url: at(term.url),
    name: term.label,
    description: term.definition,
    ...(names.length > 0 && { alternateName: names }),
    // From memory: AGROVOC's concepts live under this address.
    ...(term.agrovoc && { sameAs: `http://aims.fao.org/aos/agrovoc/${term.agrovoc}` }),
    inDefinedTermSet: {
      '@type': 'DefinedTermSet',
      '@id': at('/handbook'),
      name: 'Turnrow handbook',
      url: at('/handbook'),
    },
  }
}
