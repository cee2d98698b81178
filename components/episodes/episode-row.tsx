import Link from 'next/link'
import { StageTag } from '@/components/ui/tag'
import { fullDay } from '@/lib/dates/rules'
import type { EpisodeLine } from '@/lib/episodes/views'
import { lengthWords } from '@/lib/times/rules'
import type { Topic } from '@/lib/topics/rules'
import { cropWord, type Crop } from '@/lib/topics/crops'
import { stageWord, type StageKey } from '@/lib/topics/stage-words'

/** `Leaves`; with the crop before it where a row names several: `Maize, leaves`. */
const stageWords = (stage: StageKey, named: Crop | null, crop: Crop | null) =>
  named ? `${cropWord(named)}, ${stageWord(stage, crop).toLowerCase()}` : stageWord(stage, crop)

/** One tag per crop and principal stage, however many two-digit codes the chapters name. */
function stagesOf(topics: Topic[]) {
  const seen = new Map<string, { stage: StageKey; crop: Crop | null }>()
  for (const { stage, crop } of topics) if (stage) seen.set(`${crop} ${stage}`, { stage, crop })
  const stages = [...seen.values()]
  const mixed = new Set(stages.flatMap(({ crop }) => crop ?? [])).size > 1
  return stages.map(({ stage, crop }) => ({ stage, crop, word: stageWords(stage, mixed ? crop : null, crop) }))
}

function aboutWords({ filmedOn, duration, channel }: EpisodeLine, withFarm: boolean): string {
  const parts = [withFarm && channel.name, filmedOn && `filmed ${fullDay(filmedOn)}`, duration && lengthWords(duration)]
  return parts.filter(Boolean).join(' · ')
}

type EpisodeRowProps = {
  episode: EpisodeLine
  /** Names the farm too, in lists over several. */
  withFarm?: boolean
  level?: 2 | 3
}

/** An episode as a row of a ruled list: its number, what it is about, the stages it shows. */
export function EpisodeRow({ episode, withFarm = false, level = 3 }: EpisodeRowProps) {
  const Heading = `h${level}` as const
  const stages = stagesOf(episode.topics)
  return (
    <li className="grid grid-cols-[2.75rem_minmax(0,1fr)] gap-x-3 px-3.5 py-4 md:px-5">
      <span className="figure pt-0.5 text-2xl text-ink-3" aria-hidden="true">
        {episode.number}
      </span>
      <div className="min-w-0">
        <Heading>
          <Link href={episode.url} className="text-ink no-underline hover:underline">
            {episode.title}
          </Link>
        </Heading>
        <p className="mt-1 text-sm text-ink-3">
          <span className="sr-only">Episode {episode.number}, </span>
          {aboutWords(episode, withFarm)}
        </p>
        {episode.summary && <p className="mt-1.5 max-w-measure text-ink-2">{episode.summary}</p>}
        {stages.length > 0 && (
          <ul aria-label="Stages" className="mt-2.5 flex flex-wrap gap-1.5">
            {stages.map(({ stage, crop, word }) => (
              <li key={`${crop} ${stage}`} className="max-w-full">
                <StageTag stage={stage} word={word} />
              </li>
            ))}
          </ul>
        )}
      </div>
    </li>
  )
}
