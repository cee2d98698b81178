'use client'

import { useState, type KeyboardEvent, type ReactNode } from 'react'
import { classNames } from '@/components/ui/class-names'
import { useWide } from './use-wide'

const panels = ['spoken', 'readings', 'questions'] as const
type Panel = (typeof panels)[number]

const words: Record<Panel, string> = { spoken: 'As spoken', readings: 'Readings', questions: 'Questions' }

type WatchPanelsProps = {
  spoken: ReactNode
  readings: ReactNode
  questions: ReactNode
  counts: Partial<Record<Panel, number>>
}

/**
 * Text, readings and questions: side by side where there is room, else behind three tabs. Without JavaScript the tabs
 * are links down to sections that all show.
 */
export function WatchPanels({ counts, ...contents }: WatchPanelsProps) {
  const tabbed = useWide() === false
  const [open, setOpen] = useState<Panel>('spoken')
  const panel = (name: Panel) => ({
    id: `panel-${name}`,
    role: tabbed ? 'tabpanel' : undefined,
    'aria-labelledby': tabbed ? `tab-${name}` : undefined,
    hidden: tabbed && open !== name,
  })
  return (
    <>
      <div
        role={tabbed ? 'tablist' : undefined}
        aria-label={tabbed ? 'About this episode' : undefined}
        className="order-4 grid grid-cols-3 border-y border-rule bg-sheet lg:hidden print:hidden"
        onKeyDown={(event) => tabbed && moveTab(event, open, setOpen)}
      >
        {panels.map((name) => (
          <Tab key={name} name={name} count={counts[name]} open={open === name} tabbed={tabbed} onOpen={setOpen} />
        ))}
      </div>
      <section
        {...panel('spoken')}
        className="relative order-5 flex flex-col bg-sheet lg:col-start-2 lg:row-span-3 lg:row-start-2 lg:min-h-144 lg:border lg:border-l-0 lg:border-rule"
      >
        {contents.spoken}
      </section>
      <div className="order-6 bg-sheet lg:col-start-1 lg:row-start-4 lg:grid lg:grid-cols-2 lg:border lg:border-rule">
        <section {...panel('readings')} className="p-4.5 lg:border-r lg:border-rule-2">
          {contents.readings}
        </section>
        <section {...panel('questions')} className="p-4.5">
          {contents.questions}
        </section>
      </div>
    </>
  )
}

type TabProps = {
  name: Panel
  count: number | undefined
  open: boolean
  tabbed: boolean
  onOpen: (name: Panel) => void
}

function Tab({ name, count, open, tabbed, onOpen }: TabProps) {
  return (
    <a
      id={`tab-${name}`}
      href={`#panel-${name}`}
      role={tabbed ? 'tab' : undefined}
      aria-selected={tabbed ? open : undefined}
      aria-controls={tabbed ? `panel-${name}` : undefined}
      tabIndex={tabbed && !open ? -1 : undefined}
      onClick={(event) => {
        if (!tabbed) return
        event.preventDefault()
        onOpen(name)
      }}
      className={classNames(
        'border-rule-2 px-1.5 py-3 text-center text-[1rem] leading-tight text-ink no-underline not-last:border-r',
        open && 'border-b-3 border-b-act pb-2.25 font-semibold',
      )}
    >
      {words[name]}
      {count !== undefined && ` ${count}`}
    </a>
  )
}

const steps: Record<string, (at: number) => number> = {
  ArrowRight: (at) => (at + 1) % panels.length,
  ArrowLeft: (at) => (at + panels.length - 1) % panels.length,
  Home: () => 0,
  End: () => panels.length - 1,
}

/** The keys of the tabs pattern (WAI-ARIA APG); the panel opens with the focus, since nothing has to be fetched. */
function moveTab(event: KeyboardEvent, open: Panel, setOpen: (name: Panel) => void) {
  const to = panels[steps[event.key]?.(panels.indexOf(open)) ?? -1]
  if (event.key === ' ') event.preventDefault()
  if (!to) return
  event.preventDefault()
  setOpen(to)
  document.getElementById(`tab-${to}`)?.focus()
}
