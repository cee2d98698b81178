import Link from 'next/link'
import type { ComponentProps } from 'react'
import { classNames } from './class-names'

/** `primary` is the one main action of a screen, `line` everything beside it, `quiet` what stands inside a row. */
export type ButtonVariant = 'primary' | 'line' | 'quiet'

const shape =
  'inline-flex min-h-11 items-center justify-center gap-2 py-2 text-center text-[1rem] leading-tight font-semibold no-underline hover:no-underline'

const ink: Record<ButtonVariant, string> = {
  primary: 'border-[1.5px] border-act bg-act px-4.5 text-on-act hover:border-act-deep hover:bg-act-deep',
  line: 'border-[1.5px] border-ink bg-transparent px-4.5 text-ink hover:bg-mist',
  quiet:
    'border-[1.5px] border-transparent bg-transparent px-1 text-water underline hover:underline hover:decoration-2',
}

const resting =
  'disabled:border-dashed disabled:border-edge disabled:bg-transparent disabled:text-ink-3 aria-disabled:border-dashed aria-disabled:border-edge aria-disabled:bg-transparent aria-disabled:text-ink-3 aria-disabled:cursor-default'

/** The classes of a button, for the rare element that is neither `<button>` nor a link (a `<summary>`, a `<label>`). */
export const buttonClass = (variant: ButtonVariant = 'primary', className?: string) =>
  classNames(shape, ink[variant], resting, className)

type ButtonProps = ComponentProps<'button'> & {
  variant?: ButtonVariant
  /** What is being done right now ("Saving"). The button keeps its focus and swallows further presses. */
  busy?: string | false
}

export function Button({ variant, busy, className, children, onClick, type = 'button', ...rest }: ButtonProps) {
  return (
    <button
      {...rest}
      type={busy ? 'button' : type}
      aria-disabled={busy ? true : rest['aria-disabled']}
      onClick={busy ? undefined : onClick}
      className={buttonClass(variant, className)}
    >
      {busy ? `${busy}…` : children}
    </button>
  )
}

/** A link that is the action of its place. */
export function ButtonLink({ variant, className, ...rest }: ComponentProps<typeof Link> & { variant?: ButtonVariant }) {
  return <Link {...rest} className={buttonClass(variant, className)} />
}
