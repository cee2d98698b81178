'use client'

import { useMutation } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useRef } from 'react'
import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import type { EpisodeView } from '@/lib/episodes/views'
import { api, type ApiProblem } from '@/lib/http/client'

/** Begins an episode: a working title is enough. */
export function NewEpisodeForm({ channel }: { channel: string }) {
  const router = useRouter()
  const hydrated = useHydrated()
  // One key for one form: pressed twice, or again after a lost line, it is the same episode.
  const key = useRef<string | null>(null)
  const create = useMutation<EpisodeView, ApiProblem, { title: string; filmedOn?: string }>({
    mutationFn: async (body) => {
      key.current ??= crypto.randomUUID()
      const { data } = await api<EpisodeView>(`/api/channels/${channel}/episodes`, {
        method: 'POST',
        body,
        idempotencyKey: key.current,
      })
      return data
    },
    onSuccess: ({ id }) => router.push(`/desk/${channel}/episodes/${id}/footage`),
    onError: ({ status }) => {
      if (status >= 400 && status < 500) key.current = null
    },
  })
  return (
    <form
      className="sheet grid gap-4 p-5 md:grid-cols-[minmax(0,2fr)_minmax(0,1fr)_auto] md:items-end"
      onSubmit={(event) => {
        event.preventDefault()
        const form = new FormData(event.currentTarget)
        create.mutate({ title: String(form.get('title')), filmedOn: String(form.get('filmedOn')) || undefined })
      }}
    >
      <TextField label="Working title" name="title" required maxLength={120} autoComplete="off" />
      <TextField label="Filmed on" name="filmedOn" type="date" />
      <Button type="submit" disabled={!hydrated} busy={create.isPending && 'Making it'}>
        New episode
      </Button>
      {create.error && (
        <Notice tone="failed" title="The episode was not made." className="md:col-span-3">
          {create.error.detail}
        </Notice>
      )}
    </form>
  )
}
