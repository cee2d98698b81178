import Link from 'next/link'
import type { ReactNode } from 'react'
import { TimeCode } from '@/components/ui/time-code'
import type { QuestionView } from '@/lib/questions/views'

/** Out along one row, round at the headland, back along the next: the turn of the mark, drawn between two seconds. */
function Headland() {
  return (
    <svg
      viewBox="0 0 60 100"
      preserveAspectRatio="none"
      className="h-full w-10 stroke-flag sm:w-15 forced-colors:stroke-[CanvasText]"
      fill="none"
      aria-hidden="true"
    >
      <g strokeWidth="2.4" vectorEffect="non-scaling-stroke">
        <path d="M0 22H20C68 22 68 78 20 78H0" vectorEffect="non-scaling-stroke" />
        <path d="M0 32H18C50 32 50 68 18 68H0" vectorEffect="non-scaling-stroke" />
      </g>
    </svg>
  )
}

function End({ word, children }: { word: string; children: ReactNode }) {
  return (
    <div className="flex min-h-20 flex-col justify-center">
      <p className="text-sm text-ink-3">{word}</p>
      <p className="leading-snug">{children}</p>
    </div>
  )
}

/** Where a question went out and where it came back, each a link to its second. */
export function TheTurn({ question: { episode, at, followUp } }: { question: QuestionView }) {
  if (!followUp) return null
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-4">
      <div className="ruled">
        <End word="Asked">
          {episode ? (
            <Link href={episode.url}>
              Episode {episode.number}, {episode.title}
              {at !== null && (
                <>
                  {' at '}
                  <TimeCode seconds={at} />
                </>
              )}
            </Link>
          ) : (
            'From the questions page'
          )}
        </End>
        <End word="Answered">
          <Link href={followUp.url} className="font-semibold">
            Episode {followUp.number}, {followUp.title} at <TimeCode seconds={followUp.start} />
          </Link>
        </End>
      </div>
      <Headland />
    </div>
  )
}
