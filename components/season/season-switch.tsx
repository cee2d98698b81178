import Link from 'next/link'

type SeasonSwitchProps = { years: number[]; shown: number; hrefOf: (year: number) => string }

/** The seasons of a farm side by side, the one shown in ink. */
export function SeasonSwitch({ years, shown, hrefOf }: SeasonSwitchProps) {
  if (years.length < 2) return null
  return (
    <nav aria-label="Season" className="flex flex-wrap items-center gap-2.5">
      <span aria-hidden="true" className="eyebrow">
        Season
      </span>
      {[...years].reverse().map((year) => (
        <Link
          key={year}
          href={hrefOf(year)}
          aria-current={year === shown ? 'page' : undefined}
          className="flex min-h-11 items-center border border-rule bg-sheet px-3.5 text-ink no-underline hover:border-ink hover:no-underline aria-[current]:border-ink aria-[current]:bg-ink aria-[current]:text-sheet"
        >
          {year}
        </Link>
      ))}
    </nav>
  )
}
