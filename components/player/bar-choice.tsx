import type { ChangeEvent, ReactNode } from 'react'
import { classNames } from '@/components/ui/class-names'

type BarChoiceProps = {
  label: string
  value: string
  options: { value: string; label: string }[]
  onChoose: (value: string) => void
  /** What is read on the bar: the choice in plain words. */
  children: ReactNode
  className?: string
}

/** A choice on the player's bar: words to read, with the platform's own list laid invisibly over them. */
export function BarChoice({ label, value, options, onChoose, children, className }: BarChoiceProps) {
  return (
    <span
      className={classNames(
        'relative inline-flex min-h-11 items-center has-focus-visible:outline-3 has-focus-visible:outline-on-loam',
        className,
      )}
    >
      <span aria-hidden="true" className="underline decoration-dotted decoration-1 underline-offset-4">
        {children}
      </span>
      <select
        aria-label={label}
        value={value}
        onChange={(event: ChangeEvent<HTMLSelectElement>) => onChoose(event.target.value)}
        className="absolute inset-0 size-full cursor-pointer appearance-none bg-sheet text-ink opacity-0"
      >
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </span>
  )
}
