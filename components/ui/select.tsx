import type { ComponentProps } from 'react'
import { Field, controlClass, type FieldWords } from './field'

export type SelectOption = { value: string; label: string }
/** Options under a heading of their own. */
export type SelectGroup = { label: string; options: SelectOption[] }

type SelectProps = FieldWords & ComponentProps<'select'> & { options: (SelectOption | SelectGroup)[]; empty?: string }

/** A choice from a list: the platform's own control, because it works with gloves, a screen reader and no JavaScript. */
export function Select({ label, hint, error, id, className, options, empty, ...select }: SelectProps) {
  return (
    <Field label={label} hint={hint} error={error} id={id} className={className}>
      {(control) => (
        <select {...select} {...control} className={controlClass}>
          {empty !== undefined && <option value="">{empty}</option>}
          {options.map((entry) => ('options' in entry ? group(entry) : option(entry)))}
        </select>
      )}
    </Field>
  )
}

const option = ({ value, label }: SelectOption) => (
  <option key={value} value={value}>
    {label}
  </option>
)

const group = ({ label, options }: SelectGroup) => (
  <optgroup key={label} label={label}>
    {options.map(option)}
  </optgroup>
)
