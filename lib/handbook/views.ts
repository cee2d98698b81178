/** The states of an explainer: nobody has begun, some claims held against a publication, all of them, checked too long ago. */
export type ExplainerState = 'draft' | 'in check' | 'checked' | 'due'

/** A term in a text: `from`/`to` are character offsets (UTF-16), `slug` the term. */
export type Mention = { from: number; to: number; slug: string }

/** What the ruled sheet of a term shows. `sources` counts the publications that claims of the explainer were held against. */
export type TermNote = {
  slug: string
  label: string
  definition: string
  explainer: { slug: string; title: string; state: ExplainerState; sources: number } | null
}

/** Notes by slug, as a page hands them to the text. */
export type TermNotes = Record<string, TermNote>
