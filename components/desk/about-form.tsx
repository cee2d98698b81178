'use client'

import { Button } from '@/components/ui/button'
import { TextArea, TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import { useEpisode, useEpisodeEdit } from '@/lib/episodes/hooks'
import type { EpisodeView } from '@/lib/episodes/views'
import { ConflictNotice } from './conflict-notice'

/** An empty field takes the fact away. */
const patchOf = (form: FormData) => ({
  title: String(form.get('title')),
  filmedOn: String(form.get('filmedOn')) || null,
  season: String(form.get('season')) || null,
  summary: String(form.get('summary')) || null,
})

/** What an episode is about: title, day, season, summary. */
export function AboutForm({ episode: first }: { episode: EpisodeView }) {
  const episode = useEpisode(first)
  const hydrated = useHydrated()
  const edit = useEpisodeEdit(episode.id)
  const save = (body: object, edition: number) => edit.mutate({ path: '', method: 'PATCH', body, edition })
  return (
    <form
      // A newer edition that was chosen is drawn afresh.
      key={episode.edition}
      className="sheet grid gap-5 p-5 md:grid-cols-2"
      onSubmit={(event) => {
        event.preventDefault()
        save(patchOf(new FormData(event.currentTarget)), episode.edition)
      }}
    >
      <TextField
        label="Title"
        name="title"
        required
        maxLength={120}
        defaultValue={episode.title}
        className="md:col-span-2"
      />
      <TextField label="Filmed on" name="filmedOn" type="date" defaultValue={episode.filmedOn ?? ''} />
      <TextField
        label="Season"
        hint="The crop year it belongs to."
        name="season"
        inputMode="numeric"
        pattern="\d{4}"
        maxLength={4}
        defaultValue={episode.season ?? ''}
      />
      <TextArea
        label="Summary"
        hint="Two or three sentences: what is shown, and what somebody will know afterwards."
        name="summary"
        maxLength={2000}
        defaultValue={episode.summary ?? ''}
        className="md:col-span-2"
      />
      <div className="grid gap-3 md:col-span-2">
        <ConflictNotice
          problem={edit.error}
          what="words"
          onTheirs={() => window.location.reload()}
          onMine={(current) => save(edit.variables?.body as object, current.edition)}
        />
        {edit.isSuccess && <Notice tone="done" title="Saved." />}
        <Button type="submit" className="justify-self-start" disabled={!hydrated} busy={edit.isPending && 'Saving'}>
          Save
        </Button>
      </div>
    </form>
  )
}
