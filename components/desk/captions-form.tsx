'use client'

import { Button } from '@/components/ui/button'
import { Field, TextField, controlClass } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import { useHydrated } from '@/components/ui/use-hydrated'
import { useBringCaptions } from '@/lib/captions/hooks'
import type { EpisodeView } from '@/lib/episodes/views'
import { FileFaults } from './file-faults'

const kinds = [
  { value: 'captions', label: 'Captions: what is said and heard' },
  { value: 'subtitles', label: 'Subtitles: another language' },
  { value: 'descriptions', label: 'Descriptions: what is seen' },
]

/** Brings a caption file to an episode. */
export function CaptionsForm({ episode }: { episode: EpisodeView }) {
  const bring = useBringCaptions(episode.id)
  const hydrated = useHydrated()
  return (
    <form
      className="sheet grid gap-5 p-5 md:grid-cols-2"
      onSubmit={(event) => {
        event.preventDefault()
        const form = new FormData(event.currentTarget)
        const file = form.get('file')
        if (!(file instanceof File)) return
        bring.mutate({ file, language: String(form.get('language')), kind: String(form.get('kind')) })
      }}
    >
      <Field
        label="Caption file"
        hint="WebVTT or SRT, up to 5 MB. A second file in the same language replaces the first."
        className="md:col-span-2"
      >
        {(control) => (
          <input
            {...control}
            type="file"
            name="file"
            required
            accept=".vtt,.srt,text/vtt,application/x-subrip"
            className={controlClass}
          />
        )}
      </Field>
      <TextField
        label="Language"
        hint="As a tag: en, es, es-MX."
        name="language"
        required
        defaultValue={episode.language}
        maxLength={20}
      />
      <Select label="Kind" name="kind" options={kinds} defaultValue="captions" />
      <div className="grid gap-3 md:col-span-2">
        {bring.error && <FileFaults problem={bring.error} />}
        {bring.data && (
          <Notice tone="done" title={`${bring.data.cues.length} lines read.`}>
            {bring.data.notes.length > 0 && `${bring.data.notes.length} small things were put right on the way.`}
          </Notice>
        )}
        <Button type="submit" className="justify-self-start" disabled={!hydrated} busy={bring.isPending && 'Reading'}>
          Bring this file
        </Button>
      </div>
    </form>
  )
}
