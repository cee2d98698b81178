import { useId } from 'react'
import type { ComponentProps } from 'react'
import { classNames } from './class-names'
import type { FieldWords } from './field'

type CheckboxProps = FieldWords & Omit<ComponentProps<'input'>, 'type'> & { type?: 'checkbox' | 'radio' }

/** A box to tick (or one of a choice); the whole line takes the press. */
export function Checkbox({ label, hint, error, id, className, type = 'checkbox', ...input }: CheckboxProps) {
  const own = useId()
  const control = id ?? own
  const described = [hint && `${control}-hint`, error && `${control}-error`].filter(Boolean).join(' ')
  return (
    <div className={classNames('grid min-h-11 grid-cols-[1.25rem_1fr] items-center gap-x-3', className)}>
      <input
        {...input}
        id={control}
        type={type}
        aria-describedby={described || undefined}
        aria-invalid={error ? true : undefined}
        className="size-5 accent-act"
      />
      <label htmlFor={control} className="py-2.5 leading-snug">
        {label}
      </label>
      {hint && (
        <p id={`${control}-hint`} className="col-start-2 -mt-1.5 pb-1 text-sm text-ink-3">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${control}-error`} className="col-start-2 pb-1 text-sm font-semibold text-fault">
          {error}
        </p>
      )}
    </div>
  )
}
