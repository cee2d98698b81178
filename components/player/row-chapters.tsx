'use client'

import { useId, useState } from 'react'
import { classNames } from '@/components/ui/class-names'
import { StagePatch } from '@/components/ui/stage-patch'
import { TimeCode } from '@/components/ui/time-code'
import { VisuallyHidden } from '@/components/ui/visually-hidden'
import { chapterAt } from '@/lib/captions/rules'
import { timeCode } from '@/lib/times/rules'
import { useMoment, usePlayback } from './playback-context'
import type { RowChapter } from './row-rules'

/** About the width of a letter of a title, in CSS px; from memory, and titles that miss it only wrap. */
const letterWidth = 7.4
/** A title longer than this many lines stands taller than the row. */
const mostLines = 3
/** Below this the row shows the one chapter that plays. */
const narrowestRow = 480

type RowChaptersProps = { chapters: RowChapter[]; width: number }

/** Chapter titles as buttons: each under its block where there is room, else the one that plays, with a list. */
export function RowChapters({ chapters, width }: RowChaptersProps) {
  const duration = useMoment((moment) => moment.duration)
  const current = useMoment((moment) => chapterAt(chapters, moment.at))
  if (chapters.length === 0) return null
  const fits = chapters.every(({ start, end, title }) => fitsUnder(title, ((end - start) / duration) * width))
  if (width >= narrowestRow && fits)
    return <TitlesUnderBlocks chapters={chapters} current={current} duration={duration} />
  return <PlayingChapter chapters={chapters} current={current} />
}

/** Whether a title can stand under a block of this width without breaking inside a word. */
function fitsUnder(title: string, width: number): boolean {
  const longest = Math.max(...title.split(/\s+/).map((word) => word.length))
  return longest * letterWidth <= width && title.length * letterWidth <= width * mostLines
}

type ChapterListProps = { chapters: RowChapter[]; current: number | null }

function TitlesUnderBlocks({ chapters, current, duration }: ChapterListProps & { duration: number }) {
  const playback = usePlayback()
  return (
    <ol
      className="relative mt-3 grid text-xs text-ink-2"
      style={{ gridTemplateColumns: columnsOf(chapters, duration) }}
    >
      {chapters.map((chapter, at) => (
        <li key={chapter.start} className="min-w-0" style={{ gridColumn: 2 * at + 2 }}>
          <button
            type="button"
            aria-current={at === current ? 'true' : undefined}
            onClick={() => playback.seek(chapter.start)}
            className={classNames(
              'flex min-h-6 w-full items-start pr-1.5 text-left leading-tight hover:underline',
              at === current && 'font-semibold text-ink',
            )}
          >
            {chapter.title}
            <VisuallyHidden>, {timeCode(chapter.start)}</VisuallyHidden>
          </button>
        </li>
      ))}
    </ol>
  )
}

/** A column per chapter and one for each gap before it, so that titles stand under their blocks. */
function columnsOf(chapters: RowChapter[], duration: number): string {
  const lengths = chapters.flatMap(({ start, end }, at) => [start - (chapters[at - 1]?.end ?? 0), end - start])
  const rest = duration - (chapters.at(-1)?.end ?? 0)
  return [...lengths, rest].map((length) => `minmax(0, ${Math.max(0, length)}fr)`).join(' ')
}

function PlayingChapter({ chapters, current }: ChapterListProps) {
  const playback = usePlayback()
  const [open, setOpen] = useState(false)
  const list = useId()
  return (
    <div className="mt-2">
      <button
        type="button"
        aria-expanded={open}
        aria-controls={list}
        onClick={() => setOpen(!open)}
        className="flex min-h-11 w-full items-center justify-between gap-3 text-left"
      >
        <span className="font-semibold">{chapters[current ?? -1]?.title ?? 'Chapters'}</span>
        <span className="shrink-0 text-sm text-ink-3 underline decoration-dotted underline-offset-4">
          {current === null ? chapters.length : `${current + 1} of ${chapters.length}`}
        </span>
      </button>
      <ol id={list} hidden={!open} className="ruled border-t border-rule">
        {chapters.map((chapter, at) => (
          <li key={chapter.start}>
            <button
              type="button"
              aria-current={at === current ? 'true' : undefined}
              onClick={() => {
                playback.seek(chapter.start)
                setOpen(false)
              }}
              className={classNames(
                'flex min-h-11 w-full items-center gap-2.5 text-left',
                at === current && 'font-semibold',
              )}
            >
              {chapter.stage && <StagePatch stage={chapter.stage} />}
              <span className="min-w-0 flex-1">{chapter.title}</span>
              <TimeCode seconds={chapter.start} className="text-sm text-ink-3" />
            </button>
          </li>
        ))}
      </ol>
    </div>
  )
}
