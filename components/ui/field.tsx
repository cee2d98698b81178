import { useId } from 'react'
import type { ComponentProps, ReactNode } from 'react'
import { classNames } from './class-names'

export type FieldWords = {
  label: ReactNode
  /** What to write, before it is written. */
  hint?: ReactNode
  /** What is wrong and how to put it right. */
  error?: ReactNode
}

type ControlWiring = { id: string; 'aria-describedby'?: string; 'aria-invalid'?: true }

type FieldProps = FieldWords & { id?: string; className?: string; children: (control: ControlWiring) => ReactNode }

/** The look of anything that takes typing. */
export const controlClass =
  'block min-h-11 w-full border border-edge bg-sheet px-3 py-2 text-base text-ink placeholder:text-ink-3 aria-invalid:border-2 aria-invalid:border-fault disabled:border-dashed disabled:text-ink-3 [&[readonly]]:bg-ground'

/** A label, its control, its hint and its error, tied together for assistive technology. */
export function Field({ label, hint, error, id, className, children }: FieldProps) {
  const own = useId()
  const control = id ?? own
  const described = [hint && `${control}-hint`, error && `${control}-error`].filter(Boolean).join(' ')
  return (
    <div className={classNames('min-w-0', className)}>
      <label htmlFor={control} className="mb-1 block font-semibold">
        {label}
      </label>
      {hint && (
        <p id={`${control}-hint`} className="mb-1.5 text-sm text-ink-3">
          {hint}
        </p>
      )}
      {children({
        id: control,
        'aria-describedby': described || undefined,
        'aria-invalid': error ? true : undefined,
      })}
      {error && (
        <p id={`${control}-error`} className="mt-1.5 text-sm font-semibold text-fault">
          {error}
        </p>
      )}
    </div>
  )
}

/** One line of text, a date, a number. */
export function TextField({ label, hint, error, id, className, ...input }: FieldWords & ComponentProps<'input'>) {
  return (
    <Field label={label} hint={hint} error={error} id={id} className={className}>
      {(control) => <input type="text" {...input} {...control} className={controlClass} />}
    </Field>
  )
}

/** Text over several lines. */
export function TextArea({ label, hint, error, id, className, ...area }: FieldWords & ComponentProps<'textarea'>) {
  return (
    <Field label={label} hint={hint} error={error} id={id} className={className}>
      {(control) => <textarea rows={4} {...area} {...control} className={controlClass} />}
    </Field>
  )
}
