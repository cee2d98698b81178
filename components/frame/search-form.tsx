import { useId } from 'react'
import { buttonClass } from '@/components/ui/button'
import { classNames } from '@/components/ui/class-names'

/** The way into everything that is said: a plain form, so that it works before and without any script. */
export function SearchForm({ className, withButton }: { className?: string; withButton?: boolean }) {
  const id = useId()
  return (
    <form action="/search" method="get" role="search" className={classNames('flex gap-2', className)}>
      <label htmlFor={id} className="sr-only">
        Find a stage, a term, a question
      </label>
      <input
        id={id}
        type="search"
        name="q"
        placeholder="Find a stage, a term, a question"
        className="min-h-10.5 w-full min-w-0 border border-loam-rule bg-loam-2 px-3.5 text-sm text-on-loam placeholder:text-on-loam-2"
      />
      {withButton && (
        <button type="submit" className={buttonClass('line', 'border-on-loam! text-on-loam! hover:bg-loam!')}>
          Find
        </button>
      )}
    </form>
  )
}
