import type { ReactNode } from 'react'

type ProgressProps = {
  /** 0 to 1; leave out while the length of the work is not known. */
  value?: number | null
  /** What is being done: "Sending the film". */
  label: string
  /** How far and about how long: "412 of 980 MB, about 6 minutes left". */
  detail?: ReactNode
}

/** Long work, with what is being done and how far it is. */
export function Progress({ value, label, detail }: ProgressProps) {
  const percent = value === null || value === undefined ? null : Math.round(Math.min(1, Math.max(0, value)) * 100)
  return (
    <div>
      <div className="mb-1.5 flex flex-wrap justify-between gap-x-4 text-sm">
        <span className="font-semibold">{label}</span>
        <span className="font-mono tabular-nums">{percent === null ? 'Working' : `${percent} %`}</span>
      </div>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent ?? undefined}
        className="h-3.5 border-[1.5px] border-ink bg-sheet"
      >
        <svg className="block size-full" aria-hidden="true">
          <rect className="fill-act forced-colors:fill-[Highlight]" width={`${percent ?? 0}%`} height="100%" />
        </svg>
      </div>
      {detail && <p className="mt-1.5 text-sm text-ink-3">{detail}</p>}
    </div>
  )
}
