'use client'

import { useState, type KeyboardEvent, type PointerEvent } from 'react'
import { classNames } from '@/components/ui/class-names'
import { StagePatch } from '@/components/ui/stage-patch'
import { chapterAt } from '@/lib/captions/rules'
import { timeCode } from '@/lib/times/rules'
import { useMoment, usePlayback } from './playback-context'
import { placeAfterKey } from './player-keys'
import { announcedPlace, placeWords, rowShare, type RowChapter } from './row-rules'

/** The blocks and the needle: one slider, for pointer and keyboard alike. */
export function RowSlider({ chapters }: { chapters: RowChapter[] }) {
  const playback = usePlayback()
  const duration = useMoment((moment) => moment.duration)
  const [drawn, setDrawn] = useState<number | null>(null)
  const said = useSaidPlace(chapters)

  const go = (to: number) => {
    said.hold(to)
    playback.seek(to)
  }
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return
    const to = event.key === ' ' ? null : placeAfterKey(event.key, playback.read(), chapters)
    if (event.key === ' ') playback.toggle()
    else if (to === null) return
    else go(to)
    event.preventDefault()
  }
  const pointed = (event: PointerEvent<HTMLElement>) => {
    const { left, width } = event.currentTarget.getBoundingClientRect()
    return Math.min(Math.max(0, (event.clientX - left) / Math.max(width, 1)), 1) * duration
  }

  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label="Place in the film"
      aria-valuemin={0}
      aria-valuemax={Math.floor(duration)}
      aria-valuenow={Math.floor(said.place)}
      aria-valuetext={placeWords(said.place, duration, chapters)}
      className="relative h-11 cursor-pointer touch-pan-y outline-offset-6 select-none"
      onFocus={said.onFocus}
      onBlur={said.onBlur}
      onKeyDown={onKeyDown}
      onPointerDown={(event) => {
        if (event.button !== 0) return
        event.currentTarget.setPointerCapture(event.pointerId)
        setDrawn(pointed(event))
      }}
      onPointerMove={(event) => drawn !== null && setDrawn(pointed(event))}
      onPointerUp={(event) => {
        if (drawn !== null) go(pointed(event))
        setDrawn(null)
      }}
      onPointerCancel={() => setDrawn(null)}
    >
      <Blocks chapters={chapters} duration={duration} />
      <Needle drawn={drawn} duration={duration} />
    </div>
  )
}

/**
 * The place that is announced. While the film plays and the slider has the focus it stands still between moves: a
 * screen reader would otherwise speak over the film once a second.
 */
function useSaidPlace(chapters: RowChapter[]) {
  const place = useMoment((moment) => announcedPlace(moment.at, chapters))
  const playing = useMoment((moment) => moment.playing)
  const [held, setHeld] = useState<number | null>(null)
  return {
    place: held !== null && playing ? held : place,
    hold: (at: number) => setHeld((before) => (before === null ? null : announcedPlace(at, chapters))),
    onFocus: () => setHeld(place),
    onBlur: () => setHeld(null),
  }
}

function Blocks({ chapters, duration }: { chapters: RowChapter[]; duration: number }) {
  const current = useMoment((moment) => chapterAt(chapters, moment.at))
  return (
    <div aria-hidden="true" className="absolute inset-0 border-y border-rule bg-ground">
      {chapters.map((chapter, at) => (
        <div
          key={chapter.start}
          className={classNames(
            'absolute -inset-y-px overflow-hidden',
            at === current && 'z-10 outline-3 outline-offset-2 outline-ink',
          )}
          style={{
            left: rowShare(chapter.start, duration),
            // The gap is cut from the end, so that a block starts exactly at its second.
            width: `calc(${rowShare(chapter.end - chapter.start, duration)} - ${chapter.end < duration ? 3 : 0}px)`,
          }}
        >
          {chapter.stage ? (
            <StagePatch stage={chapter.stage} className="absolute inset-0 size-full" />
          ) : (
            <span className="absolute inset-0 border border-edge bg-mist" />
          )}
        </div>
      ))}
    </div>
  )
}

function Needle({ drawn, duration }: { drawn: number | null; duration: number }) {
  const played = useMoment((moment) => Math.round(moment.at * 10) / 10)
  return (
    <div
      aria-hidden="true"
      className="pointer-events-none absolute -top-1 -bottom-2.5 z-20 -ml-[1.25px] border-l-[2.5px] border-ink"
      style={{ left: rowShare(drawn ?? played, duration) }}
    >
      {drawn !== null && (
        <span className="absolute bottom-full -translate-x-1/2 border border-ink bg-sheet px-1.5 font-mono text-sm">
          {timeCode(drawn)}
        </span>
      )}
    </div>
  )
}
