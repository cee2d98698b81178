import { openable } from '@/lib/handbook/rules'
import type { SourceView } from '@/lib/handbook/views'

const writers = ({ authors, publisher }: SourceView) =>
  [...new Set([...authors, ...(publisher ? [publisher] : [])])].join('; ')

/** A publication as a reference: writers, year, title, and its address where it has one. */
export function SourceWords({ source }: { source: SourceView }) {
  const address = openable(source.url)
  const who = writers(source)
  return (
    <>
      {who && `${who}${source.year ? ` ${source.year}` : ''}. `}
      {address ? (
        <a href={address} rel="noopener noreferrer external">
          <cite className="not-italic">{source.title}</cite>
        </a>
      ) : (
        <cite className="not-italic">{source.title}</cite>
      )}
      {!who && source.year ? `, ${source.year}` : ''}
    </>
  )
}

/** The publications an explainer leans on. */
export function SourceList({ sources }: { sources: SourceView[] }) {
  return (
    <ol className="ruled">
      {sources.map((source) => (
        <li key={source.key} id={`source-${source.key}`} className="py-2.5 text-sm wrap-anywhere">
          <SourceWords source={source} />
        </li>
      ))}
    </ol>
  )
}
