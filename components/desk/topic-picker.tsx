'use client'

import { useId, useRef, useState, type KeyboardEvent } from 'react'
import { controlClass } from '@/components/ui/field'
import { findTopics, topicByCode } from '@/lib/topics/rules'
import { TopicChips } from './topic-chips'
import { TopicOptions } from './topic-options'

type TopicPickerProps = {
  /** Topic codes, in the order chosen. */
  value: string[]
  onChange: (codes: string[]) => void
  label: string
}

/**
 * Choosing topics by typing: an editable combobox with a list (ARIA APG), the chosen ones as chips before it.
 * Down opens and moves, Enter takes or gives back, Esc closes and then clears, Backspace in an empty field steps back
 * to the chips.
 */
export function TopicPicker({ value, onChange, label }: TopicPickerProps) {
  const id = useId()
  const root = useRef<HTMLDivElement>(null)
  const input = useRef<HTMLInputElement>(null)
  const [typed, setTyped] = useState('')
  const [open, setOpen] = useState(false)
  const [active, setActive] = useState<string | null>(null)
  const [said, setSaid] = useState('')
  const found = findTopics(typed)
  const shown = ['stage', 'job', 'subject'].flatMap((kind) => found.filter((topic) => topic.kind === kind))
  const optionId = (code: string) => `${id}-${code}`

  function show(nextTyped: string) {
    setTyped(nextTyped)
    setActive(null)
    setOpen(true)
    const count = findTopics(nextTyped).length
    setSaid(count === 0 ? 'No topic fits' : count === 1 ? '1 topic' : `${count} topics`)
  }

  function choose(code: string) {
    const had = value.includes(code)
    onChange(had ? value.filter((each) => each !== code) : [...value, code])
    setSaid(`${topicByCode(code)?.label ?? code} ${had ? 'removed' : 'added'}`)
    setTyped('')
    setActive(null)
  }

  function remove(code: string, back: boolean) {
    const at = value.indexOf(code)
    const rest = value.filter((each) => each !== code)
    // The chip under the focus goes away; its neighbour takes the focus, or the field when none is left.
    const heir = rest[back ? at - 1 : at] ?? rest[at - 1]
    const target = heir ? root.current?.querySelector<HTMLElement>(`[data-code="${heir}"]`) : null
    ;(target ?? input.current)?.focus()
    onChange(rest)
    setSaid(`${topicByCode(code)?.label ?? code} removed`)
  }

  function move(step: 1 | -1) {
    if (!open) show(typed)
    const at = shown.findIndex((topic) => topic.code === active)
    const next = at === -1 ? (step === 1 ? 0 : shown.length - 1) : (at + step + shown.length) % shown.length
    const code = shown[next]?.code ?? null
    setActive(code)
    if (code) requestAnimationFrame(() => document.getElementById(optionId(code))?.scrollIntoView({ block: 'nearest' }))
  }

  function onKeyDown(event: KeyboardEvent<HTMLInputElement>) {
    if (event.nativeEvent.isComposing) return
    const { key } = event
    if (key === 'ArrowDown' || key === 'ArrowUp') move(key === 'ArrowDown' ? 1 : -1)
    else if (key === 'Enter' && open && active) choose(active)
    else if (key === 'Escape' && open) setOpen(false)
    else if (key === 'Escape' && typed) setTyped('')
    else if (key === 'Backspace' && typed === '' && value.length > 0) {
      root.current?.querySelector<HTMLElement>('li:last-child [data-code]')?.focus()
    } else return
    event.preventDefault()
    event.stopPropagation()
  }

  const listed = open && shown.length > 0
  return (
    <div ref={root} className="min-w-0">
      <label htmlFor={id} className="mb-1 block font-semibold">
        {label}
      </label>
      <TopicChips codes={value} label={label} onRemove={remove} onLeave={() => input.current?.focus()} />
      <div className="relative">
        <input
          ref={input}
          id={id}
          type="text"
          role="combobox"
          autoComplete="off"
          spellCheck={false}
          aria-autocomplete="list"
          aria-expanded={listed}
          aria-controls={`${id}-list`}
          aria-activedescendant={listed && active ? optionId(active) : undefined}
          placeholder="Crop and stage, job or subject"
          className={controlClass}
          value={typed}
          onChange={(event) => show(event.target.value)}
          onClick={() => (open ? undefined : show(typed))}
          onBlur={() => setOpen(false)}
          onKeyDown={onKeyDown}
        />
        {listed && (
          <TopicOptions
            id={`${id}-list`}
            label={label}
            found={shown}
            chosen={value}
            active={active}
            optionId={optionId}
            onChoose={choose}
          />
        )}
        {open && shown.length === 0 && (
          <p className="mt-1.5 text-sm text-ink-3">
            No topic fits “{typed}”. Try a crop, a stage such as “tillering”, or a job such as “spraying”.
          </p>
        )}
      </div>
      <p role="status" className="sr-only">
        {said}
      </p>
    </div>
  )
}
