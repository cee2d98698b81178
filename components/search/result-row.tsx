import Link from 'next/link'
import { PinMark } from '@/components/player/pin-mark'
import { StageTag } from '@/components/ui/tag'
import { TimeCode } from '@/components/ui/time-code'
import type { SearchItem } from '@/lib/search/schema'
import { spokenTime } from '@/lib/times/rules'
import { type Crop, cropWord } from '@/lib/topics/crops'
import { type StageKey, stageWord } from '@/lib/topics/stage-words'
import { kindWord } from './kind-words'
import { MarkedText } from './marked-text'

function whereWords({ kind, state, episode }: SearchItem): string {
  const episodeWords = episode && `${episode.channel.name}, episode ${episode.number}`
  if (kind === 'question')
    return state === 'answered' && episodeWords ? `answered at ${episodeWords}` : 'waiting for its answer'
  // A whole episode is named by its title right below.
  if (kind === 'passage' && episode) return `${episodeWords}: ${episode.title}`
  return episodeWords ?? 'handbook'
}

/** What stands in the margin: the second that the link opens at, or the pennant of a question that waits. */
function Margin({ kind, start }: SearchItem) {
  if (start !== undefined) return <TimeCode seconds={start} className="text-ink-3" />
  return kind === 'question' ? <PinMark kind="waiting" /> : null
}

const stageWords = (stage: StageKey, crop: Crop | null) =>
  crop ? `${cropWord(crop)}, ${stageWord(stage, crop).toLowerCase()}` : stageWord(stage)

/** One thing that was found. The title is the link; a passage opens at the second in the margin. */
export function ResultRow({ item }: { item: SearchItem }) {
  const { title, snippet, marks, url, start, stage, crop, kind } = item
  return (
    <li className="grid grid-cols-[3.5rem_minmax(0,1fr)] gap-x-2 px-3.5 py-4 md:grid-cols-[4.5rem_minmax(0,1fr)_auto] md:px-5">
      <div className="text-sm leading-5.5">
        <Margin {...item} />
      </div>
      <div className="min-w-0">
        <p className="eyebrow">
          {kindWord[kind]} · {whereWords(item)}
        </p>
        <h2 className="mt-0.5 text-lg">
          <Link href={url} className="text-ink no-underline hover:underline">
            {title}
            {start !== undefined && <span className="sr-only">, opens at {spokenTime(start)}</span>}
          </Link>
        </h2>
        {snippet && (
          <p className="mt-1 max-w-measure text-ink-2">
            <MarkedText text={snippet} marks={marks} />
          </p>
        )}
      </div>
      {stage && (
        <p className="col-start-2 mt-2 md:col-start-3 md:mt-0">
          <StageTag stage={stage} word={stageWords(stage, crop)} />
        </p>
      )}
    </li>
  )
}
