import Link from 'next/link'
import { StageTag } from '@/components/ui/tag'
import { dayAndMonth, type Day } from '@/lib/dates/rules'
import { stageCode } from '@/lib/seasons/rules'
import type { FilmedEpisode, PlantingView } from '@/lib/seasons/views'
import { cropWord } from '@/lib/topics/crops'
import { lanesOf } from './board-geometry'
import { fieldWords, type SeasonBoardProps } from './season-board'

const title = 'The season as a list'

/** The board as plain lists: in the open where a screen is too narrow to show a year at once, else folded away. */
export function BoardList(props: SeasonBoardProps) {
  if (props.season.plantings.length === 0 && props.episodes.length === 0) return null
  return (
    <>
      <section className="sheet mt-6 md:hidden">
        <h2 className="border-b border-rule-2 px-3.5 py-3.5">{title}</h2>
        <Lanes {...props} />
      </section>
      <details className="sheet group hidden border-t-0 md:block">
        <summary className="px-4.5 py-3 font-semibold text-water underline group-open:border-b group-open:border-rule-2">
          {title}
        </summary>
        <Lanes {...props} />
      </details>
    </>
  )
}

function Lanes({ season, episodes, today, units, episodesUrl }: SeasonBoardProps) {
  const { lanes, rest } = lanesOf(season, episodes)
  const stageHref = (code: string) => `${episodesUrl}?season=${season.year}&stage=${code}`
  return (
    <div className="ruled md:grid md:grid-cols-2 lg:grid-cols-3 md:[&>*+*]:border-t-0">
      {lanes.map(({ planting, episodes: own }) => (
        <section key={planting.id} className="px-3.5 py-4 md:px-4.5">
          <h3>{cropWord(planting.crop)}</h3>
          <p className="text-sm text-ink-3">{fieldWords(planting, units)}</p>
          <Stages planting={planting} today={today} href={stageHref} />
          <Filmed episodes={own} />
        </section>
      ))}
      {rest.length > 0 && (
        <section className="px-3.5 py-4 md:px-4.5">
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
