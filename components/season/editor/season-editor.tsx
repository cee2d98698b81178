'use client'

import { useRef } from 'react'
import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import type { Units } from '@/lib/auth/actor'
import type { SeasonView } from '@/lib/seasons/views'
import { LaneEditor } from './lane-editor'
import { SaveNotice } from './save-notice'
import { useSeasonForm } from './use-season-form'

type SeasonEditorProps = { channel: string; season: SeasonView; units: Units }

const newKey = () => crypto.randomUUID()

/** The desk's form for a season: its lanes and their stages, saved as a whole. */
export function SeasonEditor({ channel, season, units }: SeasonEditorProps) {
  const form = useSeasonForm(channel, season, units)
  const { draft, change, findings, unsaved, edition, save, saving } = form
  const body = useRef<HTMLFormElement>(null)
  const messages = new Map(findings.map(({ path, message }) => [path, message]))

  const submit = () => {
    if (save(edition)) return
    // After the messages are on the page: to the first field that needs a hand.
    requestAnimationFrame(() => body.current?.querySelector<HTMLElement>('[aria-invalid]')?.focus())
  }

  return (
    <form
      ref={body}
      noValidate
      // The bar at the foot must not lie over the field that has the focus (WCAG 2.2, 2.4.11).
      className="space-y-5 [&_button]:scroll-mb-24 [&_input]:scroll-mb-24 [&_select]:scroll-mb-24"
      onSubmit={(event) => {
        event.preventDefault()
        submit()
      }}
    >
      {draft.length === 0 && (
        <EmptyState title="No lane yet">
          A lane is one crop on one field. Give it the days of its stages, and episodes filmed on those days stand over
          them on the board.
        </EmptyState>
      )}
      {draft.map((lane, index) => (
        <LaneEditor
          key={lane.key}
          lane={lane}
          year={season.year}
          units={units}
          errorAt={(field) => messages.get(`plantings.${index}.${field}`)}
          change={change}
        />
      ))}
      <Button variant="line" onClick={() => change({ move: 'add', key: newKey() })}>
        Add a lane
      </Button>
      <div className="sticky bottom-0 z-20 -mx-px border border-rule bg-sheet px-4 py-3">
        <SaveNotice
          failed={saving.isError}
          problem={form.problem}
          theirs={form.theirs}
          onTakeTheirs={form.takeTheirs}
          onSaveOver={save}
        />
        <div className="flex flex-wrap items-center gap-x-5 gap-y-2">
          <Button type="submit" busy={saving.isPending && 'Saving'}>
            Save the {season.year} season
          </Button>
          <p role="status" className="text-sm text-ink-2">
            {findings.length > 0 ? `${findings.length} to put right` : unsaved ? 'Not saved yet' : 'All saved'}
          </p>
        </div>
      </div>
    </form>
  )
}
