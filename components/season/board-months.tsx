import { dayAndMonth, monthsBetween, shortMonth, yearOf, type Day } from '@/lib/dates/rules'
import { classNames } from '@/components/ui/class-names'
import { dayAt, middleOf, type Span } from './board-geometry'

const monthsOf = (span: Span) => monthsBetween(span.from, span.to)

/** The names of the months over the board; the year beside January and the first month where the board shows two years. */
export function BoardMonths({ span }: { span: Span }) {
  const twoYears = yearOf(span.from) !== yearOf(span.to)
  return (
    <div aria-hidden="true" className="flex border-b border-rule text-sm text-ink-3">
      <div className="hidden w-47.5 shrink-0 md:block" />
      <div className="relative h-10.5 flex-1">
        {monthsOf(span).map((month, index) => (
          <span
            key={month}
            className={classNames('absolute inset-y-0 py-2.5 pl-2', index > 0 && 'border-l border-rule-2')}
            style={{ left: `${dayAt(span, month)}%` }}
          >
            {shortMonth(month)}
            {twoYears && (index === 0 || month.slice(5, 7) === '01') && ` ${yearOf(month)}`}
          </span>
        ))}
      </div>
    </div>
  )
}

const onBoard = ({ from, to }: Span, day: Day) => from <= day && day <= to

/** The foot of the board: which line is today. */
export function BoardFoot({ span, today }: { span: Span; today: Day }) {
  if (!onBoard(span, today)) return null
  // Kept inside the board at both of its edges.
  const at = Math.min(95, Math.max(5, middleOf(span, today)))
  return (
    <div aria-hidden="true" className="flex border-b border-rule-2">
      <div className="hidden w-47.5 shrink-0 md:block" />
      <div className="relative h-8 flex-1">
        <i
          className="absolute top-0 h-2 border-l-[2.5px] border-dashed border-ink"
          style={{ left: `${middleOf(span, today)}%` }}
        />
        <span
          className="absolute top-1.5 -translate-x-1/2 bg-ink px-2 text-xs leading-5 font-semibold whitespace-nowrap text-sheet"
          style={{ left: `${at}%` }}
        >
          Today, {dayAndMonth(today)}
        </span>
      </div>
    </div>
  )
}

/** What is drawn behind every lane: hairlines where months begin, and today. */
export function BoardGrid({ span, today }: { span: Span; today: Day }) {
  return (
    <div aria-hidden="true">
      {monthsOf(span)
        .slice(1)
        .map((month) => (
          <i
            key={month}
            className="absolute inset-y-0 border-l border-rule-2"
            style={{ left: `${dayAt(span, month)}%` }}
          />
        ))}
      {onBoard(span, today) && (
        <i
          className="pointer-events-none absolute inset-y-0 z-10 border-l-[2.5px] border-dashed border-ink"
          style={{ left: `${middleOf(span, today)}%` }}
        />
      )}
    </div>
  )
}
