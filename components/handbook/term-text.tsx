import Link from 'next/link'
import { Fragment } from 'react'
import { cutAtMentions } from '@/lib/handbook/rules'
import type { Mention, TermNotes } from '@/lib/handbook/views'
import { TermLink } from './term-link'

type TermTextProps = {
  text: string
  /** Where the terms stand in `text`. */
  terms: readonly Mention[]
  /** By slug; a term without a note is a plain link to its page. */
  notes: TermNotes
}

/** A text with its terms underlined in dots. Renders inline: put it into the paragraph it belongs to. */
export function TermText({ text, terms, notes }: TermTextProps) {
  return cutAtMentions(text, terms).map((piece) => {
    if (!piece.slug) return <Fragment key={piece.from}>{piece.text}</Fragment>
    const note = notes[piece.slug]
    if (note) {
      return (
        <TermLink key={piece.from} note={note}>
          {piece.text}
        </TermLink>
      )
    }
    return (
      <Link key={piece.from} href={`/handbook/terms/${piece.slug}`} prefetch={false} className="term">
        {piece.text}
      </Link>
    )
  })
}
