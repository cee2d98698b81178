import { Fragment, memo } from 'react'
import { TermText } from '@/components/handbook/term-text'
import { classNames } from '@/components/ui/class-names'
import type { Paragraph } from '@/lib/captions/rules'
import type { TermNotes } from '@/lib/handbook/views'
import { TimeLink } from './time-link'

type SpokenParagraphProps = {
  paragraph: Paragraph
  notes: TermNotes
  /** The place in this paragraph of the sentence being spoken, or -1. */
  now: number
  /** Said where people take turns. */
  speaker: string | null
}

/**
 * A paragraph of the text as spoken, its time in the margin. Memoised: of two thousand lines only the paragraph that is
 * left and the one that is entered are drawn again.
 */
export const SpokenParagraph = memo(function SpokenParagraph({ paragraph, notes, now, speaker }: SpokenParagraphProps) {
  return (
    <p className="relative mb-2.5 text-ink-2 sm:pl-14">
      <TimeLink
        at={paragraph.start}
        className="mb-0.5 block w-fit min-w-6 text-sm text-ink-3 no-underline hover:underline sm:absolute sm:top-0.5 sm:left-0 sm:mb-0"
      />
      {speaker && <b className="font-semibold text-ink">{speaker}: </b>}
      {paragraph.sentences.map((sentence, at) => (
        <Fragment key={sentence.start}>
          <span
            data-start={sentence.start}
            data-now={at === now ? '' : undefined}
            className={classNames(
              'cursor-pointer hover:bg-mist',
              at === now && 'border-b-3 border-act text-ink print:border-0',
            )}
          >
            <TermText text={sentence.text} terms={sentence.terms} notes={notes} />
          </span>{' '}
        </Fragment>
      ))}
    </p>
  )
})
