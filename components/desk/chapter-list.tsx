'use client'

import { usePlayback, useMoment } from '@/components/player/playback-context'
import type { FieldProblem } from '@/lib/http/client'
import { parseTime } from '@/lib/times/parse'
import { type ChapterDraft, changed, faultOf, inOrder, without } from './chapter-draft'
import { ChapterRow } from './chapter-row'

type ChapterListProps = {
  drafts: ChapterDraft[]
  /** what the server found, by path `chapters.2.start` over the list in order */
  faults: FieldProblem[]
  /** also what is merely not written yet */
  strict: boolean
  onChange: (drafts: ChapterDraft[]) => void
}

/** What the server said of one row, by field. */
function toldOf(faults: FieldProblem[], place: number): Record<string, string> {
  const own = faults.filter(({ path }) => path.startsWith(`chapters.${place}.`))
  return Object.fromEntries(own.map(({ path, message }) => [path.split('.')[2] ?? '', message]))
}

export function ChapterList({ drafts, faults, strict, onChange }: ChapterListProps) {
  const playback = usePlayback()
  const ordered = inOrder(drafts)
  const watched = useMoment(({ at }) => {
    const started = ordered.filter(({ start }) => (parseTime(start) ?? Infinity) <= at)
    return started.at(-1)?.key ?? null
  })
  return (
    <ol aria-label="Chapters" className="sheet">
      {drafts.map((draft) => {
        const place = ordered.indexOf(draft)
        const own = strict ? faultOf(draft) : {}
        return (
          <ChapterRow
            key={draft.key}
            draft={draft}
            number={place + 1}
            faults={{ ...own, ...toldOf(faults, place) }}
            current={draft.key === watched}
            onChange={(part) => onChange(changed(drafts, draft.key, part))}
            onRemove={() => onChange(without(drafts, draft.key))}
            onWatch={() => playback.seek(parseTime(draft.start) ?? 0)}
          />
        )
      })}
    </ol>
  )
}
