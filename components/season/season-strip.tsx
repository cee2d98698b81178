import { StagePatch } from '@/components/ui/stage-patch'
import type { Day } from '@/lib/dates/rules'
import { boardSpan, stageOn } from '@/lib/seasons/rules'
import type { PlantingView, SeasonView } from '@/lib/seasons/views'
import { cropWord } from '@/lib/topics/crops'
import { stageWord } from '@/lib/topics/stage-words'
import { middleOf, shapeOf, type Span } from './board-geometry'

/** A farm's year at a glance: its lanes as narrow bars, with the stage each is in today said in words. */
export function SeasonStrip({ season, today }: { season: SeasonView; today: Day }) {
  const span = boardSpan(season.year, season.plantings)
  return (
    <ul aria-label={`The ${season.year} season`} className="space-y-2.5 md:space-y-1.5">
      {season.plantings.map((planting) => (
        <StripLane key={planting.id} planting={planting} span={span} today={today} />
      ))}
    </ul>
  )
}

function StripLane({
  planting: { crop, field, windows },
  span,
  today,
}: {
  planting: PlantingView
  span: Span
  today: Day
}) {
  const stage = stageOn(windows, today)
  return (
    <li className="grid grid-cols-2 items-center gap-x-3 text-sm md:grid-cols-[6rem_minmax(0,1fr)_9rem]">
      <span className="font-semibold">
        {cropWord(crop)}
        <span className="sr-only">, {field}:</span>
      </span>
      <span
        aria-hidden="true"
        className="relative col-span-2 row-start-2 block h-4.5 bg-ground md:col-span-1 md:col-start-2 md:row-start-1"
      >
        {windows.map((window) => {
          const shape = shapeOf(span, window)
          return (
            shape && (
              <span
                key={window.startsOn}
                className="absolute inset-y-0 border-r border-sheet"
                style={{ left: `${shape.left}%`, width: `${shape.width}%` }}
              >
                <StagePatch stage={window.stage} className="size-full" />
              </span>
            )
          )
        })}
        {span.from <= today && today <= span.to && (
          <i
            className="absolute -inset-y-1 border-l-[2.5px] border-ink"
            style={{ left: `${middleOf(span, today)}%` }}
          />
        )}
      </span>
      <span className="text-right text-ink-2 md:text-left">
        {stage ? `${stageWord(stage.stage, crop)} now` : 'no stage set now'}
      </span>
    </li>
  )
}
