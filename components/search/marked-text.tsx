import { piecesOf, type MarkedText } from '@/lib/search/mark-rules'

/** A text with its found words marked. Set as text throughout: nothing in it is ever read as markup. */
export function MarkedText(marked: MarkedText) {
  return piecesOf(marked).map(({ text, found }, at) =>
    found ? (
      <mark key={at} className="bg-act-tint font-semibold text-ink">
        {text}
      </mark>
    ) : (
      text
    ),
  )
}
