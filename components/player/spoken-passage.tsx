import { Fragment, memo } from 'react'
import { StagePatch } from '@/components/ui/stage-patch'
import type { Paragraph, Passage } from '@/lib/captions/rules'
import type { TermNotes } from '@/lib/handbook/views'
import type { RowChapter, RowCorrection } from './row-rules'
import { SpokenCorrection } from './spoken-correction'
import { SpokenParagraph } from './spoken-paragraph'

type SpokenPassageProps = {
  passage: Passage
  chapter: RowChapter | null
  corrections: RowCorrection[]
  notes: TermNotes
  /** The start of the sentence being spoken, in seconds; null while that is none of this passage. */
  now: number | null
  takeTurns: boolean
}

/** The paragraphs of one chapter under its title. */
export const SpokenPassage = memo(function SpokenPassage(props: SpokenPassageProps) {
  const { passage, chapter, corrections, notes, now, takeTurns } = props
  return (
    <section>
      {chapter && <PassageTitle title={chapter.title} stage={chapter.stage} />}
      {passage.paragraphs.map((paragraph, at) => (
        <Fragment key={paragraph.start}>
          <SpokenParagraph
            paragraph={paragraph}
            notes={notes}
            now={paragraph.sentences.findIndex((sentence) => sentence.start === now)}
            speaker={takeTurns && paragraph.speaker !== passage.paragraphs[at - 1]?.speaker ? paragraph.speaker : null}
          />
          {corrections
            .filter((correction) => belongsTo(correction.at, paragraph, passage.paragraphs[at + 1]))
            .map((correction) => (
              <SpokenCorrection key={correction.id} correction={correction} />
            ))}
        </Fragment>
      ))}
    </section>
  )
})

/** A correction follows the paragraph it is pinned in, also when it is pinned to the silence after it. */
function belongsTo(at: number, paragraph: Paragraph, next: Paragraph | undefined): boolean {
  return at >= paragraph.start && (next ? at < next.start : at <= paragraph.end + 5)
}

const PassageTitle = memo(function PassageTitle({ title, stage }: Pick<RowChapter, 'title' | 'stage'>) {
  return (
    <h3 className="mt-5 mb-1.5 flex items-center gap-2.5 text-xl">
      {stage && <StagePatch stage={stage} className="size-5" />}
      <span className="min-w-0">{title}</span>
    </h3>
  )
})
