'use client'

import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'

type Props = {
  label: string
  value: string
  error?: string
  onChange: (value: string) => void
  /** The second that the film stands at, as it is written. */
  here: () => string
}

/** A position in the film: typed as m:ss, or taken from where the film stands. */
export function SecondField({ label, value, error, onChange, here }: Props) {
  return (
    <div>
      <TextField
        label={label}
        value={value}
        error={error}
        placeholder="m:ss"
        inputMode="decimal"
        autoComplete="off"
        onChange={(event) => onChange(event.target.value)}
      />
      <Button variant="quiet" className="-ml-2" onClick={() => onChange(here())}>
        Take the current second
      </Button>
    </div>
  )
}
