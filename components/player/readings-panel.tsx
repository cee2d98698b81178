'use client'

import { chapterAt } from '@/lib/captions/rules'
import { useMoment } from './playback-context'
import { PinMark } from './pin-mark'
import { readingParts, type RowChapter, type RowReading } from './row-rules'
import { TimeLink } from './time-link'

type ReadingsPanelProps = { readings: RowReading[]; chapters: RowChapter[] }

/** The measurements said in the chapter that plays, large; those of the other chapters below. */
export function ReadingsPanel({ readings, chapters }: ReadingsPanelProps) {
  const current = useMoment((moment) => chapterAt(chapters, moment.at))
  const isHere = (reading: RowReading) => chapterAt(chapters, reading.at) === current
  const here = readings.filter(isHere)
  const elsewhere = readings.filter((reading) => !isHere(reading))
  return (
    <>
      <h2 className="mb-2.5 text-lg">Readings on camera</h2>
      {here.length === 0 && (
        <p className="text-ink-3">
          {readings.length === 0 ? 'Nothing is measured in this episode.' : 'Nothing is measured in this chapter.'}
        </p>
      )}
      <ul className="grid gap-3">
        {here.map((reading) => (
          <li key={reading.at}>
            <LargeReading reading={reading} />
          </li>
        ))}
      </ul>
      {elsewhere.length > 0 && (
        <>
          <h3 className="mt-4 mb-1 font-text text-sm font-semibold tracking-normal text-ink-3">In other chapters</h3>
          <ul className="text-sm">
            {elsewhere.map((reading) => (
              <li key={reading.at} className="flex gap-3 py-1">
                <TimeLink at={reading.at} className="min-w-10" />
                <span className="min-w-0">
                  {readingParts(reading).figure} {readingParts(reading).words}
                </span>
              </li>
            ))}
          </ul>
        </>
      )}
    </>
  )
}

function LargeReading({ reading }: { reading: RowReading }) {
  const { figure, words } = readingParts(reading)
  return (
    <div className="flex items-start gap-1">
      <PinMark kind="reading" className="mt-0.5 -ml-2" />
      <div className="grid min-w-0 grid-cols-[auto_minmax(0,1fr)] items-baseline gap-x-3.5">
        <span className="font-display text-[1.6875rem] leading-none font-semibold whitespace-nowrap">{figure}</span>
        <span className="min-w-0">
          {words}
          {reading.note && `, ${reading.note}`}
          <TimeLink at={reading.at} className="ml-2 text-sm" />
        </span>
      </div>
    </div>
  )
}
