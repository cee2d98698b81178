'use client'

import { useMemo, useRef, useState, type MouseEvent } from 'react'
import { EmptyState } from '@/components/ui/empty-state'
import { paragraphsOf, sentenceAt, sentencesIn, type CueText, type Passage, type Sentence } from '@/lib/captions/rules'
import type { TermNotes } from '@/lib/handbook/views'
import { FindInEpisode } from './find-in-episode'
import { usePlayback, useMoment } from './playback-context'
import type { RowChapter, RowCorrection } from './row-rules'
import { SpokenHeader } from './spoken-header'
import { SpokenPassage } from './spoken-passage'
import { useFollow } from './use-follow'

type AsSpokenProps = {
  spoken: CueText[]
  chapters: RowChapter[]
  corrections: RowCorrection[]
  notes: TermNotes
}

/** Signature 4: what is said as running text beside the picture. It follows, it seeks, and it explains its terms. */
export function AsSpoken({ spoken, chapters, corrections, notes }: AsSpokenProps) {
  const playback = usePlayback()
  const passages = useMemo(() => paragraphsOf(spoken, chapters), [spoken, chapters])
  const sentences = useMemo(() => sentencesIn(passages), [passages])
  const now = useMoment((moment) => sentenceAt(sentences, moment.at))
  const box = useRef<HTMLDivElement>(null)
  const { following, resume } = useFollow(box, now)
  const [finding, setFinding] = useState(false)
  const takeTurns = new Set(spoken.map((cue) => cue.speaker)).size > 1

  const onClick = (event: MouseEvent<HTMLElement>) => {
    const start = startUnder(event)
    if (start === null) return
    playback.seek(start)
    resume()
  }

  return (
    <div className="flex min-h-0 flex-1 flex-col lg:absolute lg:inset-0 print:static">
      <SpokenHeader finding={finding} onFind={() => setFinding(!finding)} />
      {finding && <FindInEpisode sentences={sentences} onGo={resume} />}
      <div
        ref={box}
        onClick={onClick}
        className="relative px-3.5 pt-1 pb-6 lg:min-h-0 lg:flex-1 lg:overflow-y-auto lg:px-5.5 print:overflow-visible"
      >
        {passages.length === 0 && (
          <EmptyState title="No captions yet">
            What is said in the film will stand here, with times to jump to.
          </EmptyState>
        )}
        {passages.map((passage) => (
          <SpokenPassage
            key={passage.paragraphs[0]?.start}
            passage={passage}
            chapter={chapters[passage.chapter ?? -1] ?? null}
            corrections={corrections}
            notes={notes}
            now={startWithin(passage, sentences[now])}
            takeTurns={takeTurns}
          />
        ))}
      </div>
      {!following && passages.length > 0 && <FollowButton onPress={resume} />}
    </div>
  )
}

/** Null in every passage but the one being spoken, so that the others are not drawn again. */
function startWithin({ paragraphs }: Passage, sentence: Sentence | undefined): number | null {
  if (!sentence) return null
  const from = paragraphs[0]?.start ?? Infinity
  const to = paragraphs.at(-1)?.end ?? -Infinity
  return sentence.start >= from && sentence.start <= to ? sentence.start : null
}

function FollowButton({ onPress }: { onPress: () => void }) {
  return (
    <div className="pointer-events-none sticky bottom-20 z-10 -mt-14 grid justify-center pb-2 lg:bottom-0 print:hidden">
      <button
        type="button"
        onClick={onPress}
        className="pointer-events-auto min-h-11 border-[1.5px] border-ink bg-sheet px-4 font-semibold hover:bg-mist"
      >
        Follow the picture
      </button>
    </div>
  )
}

/** The start of the sentence that was clicked; null for links in it and for a text that is being marked to copy. */
function startUnder(event: MouseEvent<HTMLElement>): number | null {
  if (!(event.target instanceof Element) || event.target.closest('a, button')) return null
  if (window.getSelection()?.isCollapsed === false) return null
  const start = event.target.closest<HTMLElement>('[data-start]')?.dataset.start
  return start === undefined ? null : Number(start)
}
