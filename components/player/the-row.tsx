'use client'

import { useMemo, useRef, useState } from 'react'
import { chapterAt } from '@/lib/captions/rules'
import { useMoment, usePlayback, wholeSecond } from './playback-context'
import { RowChapters } from './row-chapters'
import { RowPins } from './row-pins'
import {
  lanesOf,
  pinsOf,
  turningPin,
  type RowChapter,
  type RowCorrection,
  type RowQuestion,
  type RowReading,
} from './row-rules'
import { RowSlider } from './row-slider'
import { RowTurn } from './row-turn'
import { useWidth } from './use-width'

type TheRowProps = {
  chapters: RowChapter[]
  readings: RowReading[]
  questions: RowQuestion[]
  corrections: RowCorrection[]
}

/** Signature 3: chapters as blocks in their stage's pattern, pins above them, and the control that seeks. */
export function TheRow({ chapters, readings, questions, corrections }: TheRowProps) {
  const playback = usePlayback()
  const duration = useMoment((moment) => moment.duration)
  const strip = useRef<HTMLDivElement>(null)
  const width = useWidth(strip, 640)
  const pins = useMemo(() => pinsOf({ readings, questions, corrections }), [readings, questions, corrections])
  const lanes = useMemo(() => lanesOf(pins, duration, width), [pins, duration, width])
  const [chosen, setChosen] = useState<string | null>(null)
  const passed = useMoment((moment) => passedPin(pins, chapters, wholeSecond(moment)))
  const turning = pins.find((pin) => pin.key === (chosen ?? passed)) ?? null
  const turns = pins.some((pin) => pin.turn)

  return (
    <section aria-label="Chapters, readings and questions" className="@container bg-sheet px-4.5 pt-1.5 pb-3">
      <div ref={strip} className="relative">
        {turns && <RowTurn pin={turning} lanes={lanes} pins={pins} duration={duration} width={width} />}
        <RowPins
          pins={pins}
          lanes={lanes}
          duration={duration}
          onChoose={(pin) => {
            setChosen(pin.turn ? pin.key : null)
            playback.seek(pin.at)
          }}
        />
        <RowSlider chapters={chapters} />
      </div>
      <RowChapters chapters={chapters} width={width} />
    </section>
  )
}

function passedPin(pins: ReturnType<typeof pinsOf>, chapters: RowChapter[], at: number): string | null {
  return turningPin(pins, chapters[chapterAt(chapters, at) ?? -1], at)?.key ?? null
}
