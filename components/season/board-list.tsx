import Link from 'next/link'
import { StageTag } from '@/components/ui/tag'
import { dayAndMonth, type Day } from '@/lib/dates/rules'
import { stageCode } from '@/lib/seasons/rules'
import type { FilmedEpisode, PlantingView } from '@/lib/seasons/views'
import { cropWord } from '@/lib/topics/crops'
import { lanesOf } from './board-geometry'
import { fieldWords, type SeasonBoardProps } from './season-board'

/** The board as plain lists, for a screen too narrow to show a year at once. */
export function BoardList({ season, episodes, today, units, episodesUrl }: SeasonBoardProps) {
  const { lanes, rest } = lanesOf(season, episodes)
  const stageHref = (code: string) => `${episodesUrl}?season=${season.year}&stage=${code}`
  return (
    <div className="sheet ruled md:hidden">
      {lanes.map(({ planting, episodes: own }) => (
        <section key={planting.id} className="px-3.5 py-4">
          <h3>{cropWord(planting.crop)}</h3>
          <p className="text-sm text-ink-3">{fieldWords(planting, units)}</p>
          <Stages planting={planting} today={today} href={stageHref} />
          <Filmed episodes={own} />
        </section>
      ))}
      {rest.length > 0 && (
        <section className="px-3.5 py-4">
          <h3>Whole farm</h3>
          <Filmed episodes={rest} />
        </section>
      )}
    </div>
  )
}

type StagesProps = { planting: PlantingView; today: Day; href: (code: string) => string }

function Stages({ planting: { crop, windows }, today, href }: StagesProps) {
  return (
    <ol className="mt-2">
      {windows.map(({ stage, startsOn, endsOn }) => (
        <li key={startsOn}>
          <Link
            href={href(stageCode(crop, stage))}
            className="flex min-h-11 flex-wrap items-center gap-x-3 gap-y-0.5 py-1 text-ink no-underline"
          >
            <StageTag stage={stage} crop={crop} />
            <span className="text-sm text-ink-2">
              {dayAndMonth(startsOn)} to {dayAndMonth(endsOn)}
              {startsOn <= today && today <= endsOn && <b className="text-ink"> · now</b>}
            </span>
          </Link>
        </li>
      ))}
    </ol>
  )
}

function Filmed({ episodes }: { episodes: FilmedEpisode[] }) {
  if (episodes.length === 0) return null
  return (
    <ul className="mt-3 border-t border-rule-2 pt-2">
      {episodes.map(({ number, title, url, filmedOn }) => (
        <li key={url} className="grid grid-cols-[2rem_1fr] py-1.5">
          <b>{number}</b>
          <span>
            <Link href={url}>{title}</Link> <span className="text-sm text-ink-3">{dayAndMonth(filmedOn)}</span>
          </span>
        </li>
      ))}
    </ul>
  )
}
