'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useEpisode, useEpisodeEdit } from '@/lib/episodes/hooks'
import type { EpisodeView } from '@/lib/episodes/views'
import { parseTime } from '@/lib/times/parse'
import { ConflictNotice } from './conflict-notice'
import { emptyReading, isSoundReading, type ReadingDraft, readingDrafts, readingsBody } from './reading-draft'

const fields = [
  { name: 'at', label: 'At' },
  { name: 'quantity', label: 'What was measured' },
  { name: 'value', label: 'Value' },
  { name: 'unit', label: 'Unit' },
  { name: 'note', label: 'Note' },
] as const

/** Measurements said on camera, each at its second. */
export function ReadingsEditor({ episode: first }: { episode: EpisodeView }) {
  const episode = useEpisode(first)
  const [drafts, setDrafts] = useState(() => readingDrafts(first))
  const edit = useEpisodeEdit(episode.id)
  const sound = drafts.every(isSoundReading)
  const save = (edition: number) =>
    edit.mutate({ path: '/readings', method: 'PUT', body: readingsBody(drafts), edition })
  const change = (key: string, part: Partial<ReadingDraft>) =>
    setDrafts(drafts.map((draft) => (draft.key === key ? { ...draft, ...part } : draft)))
  return (
    <section aria-labelledby="readings" className="sheet grid gap-4 p-5">
      <h3 id="readings">Readings on camera</h3>
      {drafts.length === 0 && (
        <p className="text-ink-2">A measurement that is said: 19 plants per square foot at 3:08.</p>
      )}
      {drafts.map((draft, n) => (
        <fieldset
          key={draft.key}
          className="grid gap-3 md:grid-cols-[6rem_minmax(0,1fr)_6rem_8rem_minmax(0,1fr)_auto] md:items-end"
        >
          <legend className="sr-only">Reading {n + 1}</legend>
          {fields.map(({ name, label }) => (
            <TextField
              key={name}
              label={label}
              value={draft[name]}
              error={name === 'at' && draft.at !== '' && parseTime(draft.at) === null ? 'Like 3:12' : undefined}
              onChange={(event) => change(draft.key, { [name]: event.target.value })}
            />
          ))}
          <Button variant="quiet" onClick={() => setDrafts(drafts.filter(({ key }) => key !== draft.key))}>
            Remove<span className="sr-only"> reading {n + 1}</span>
          </Button>
        </fieldset>
      ))}
      <ConflictNotice
        problem={edit.error}
        what="readings"
        onTheirs={(current) => setDrafts(readingDrafts(current))}
        onMine={(current) => save(current.edition)}
      />
      {edit.isSuccess && <Notice tone="done" title="Readings saved." />}
      <div className="flex flex-wrap gap-2.5">
        <Button variant="line" onClick={() => setDrafts([...drafts, emptyReading()])}>
          Add a reading
        </Button>
        <Button disabled={!sound} onClick={() => save(episode.edition)} busy={edit.isPending && 'Saving'}>
          Save readings
        </Button>
      </div>
    </section>
  )
}
