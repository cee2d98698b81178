'use client'

import { useState } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'
import { dateAndTime, momentOf } from '@/lib/dates/when'
import { useEpisode, useEpisodeEdit } from '@/lib/episodes/hooks'
import type { EpisodeView } from '@/lib/episodes/views'

function Standing({ episode }: { episode: EpisodeView }) {
  const { state, publishAt, publishedAt, channel, url } = episode
  if (state === 'published' && publishedAt)
    return (
      <Notice
        tone="done"
        title={`Published since ${dateAndTime(publishedAt, channel.timeZone)}.`}
        action={<ButtonLink href={url}>See it as published</ButtonLink>}
      />
    )
  if (state === 'scheduled' && publishAt)
    return <Notice tone="done" title={`Goes out on ${dateAndTime(publishAt, channel.timeZone)}, farm time.`} />
  if (state === 'withdrawn') return <Notice title="Withdrawn. Nobody outside this desk can see it." />
  return null
}

/** Publishes now or at an hour of the farm's clock; withdraws. */
export function PublishPanel({ episode: first, ready }: { episode: EpisodeView; ready: boolean }) {
  const episode = useEpisode(first)
  const hydrated = useHydrated()
  const [clock, setClock] = useState('')
  const edit = useEpisodeEdit(episode.id)
  const send = (path: '/publish' | '/withdraw', at?: string) =>
    edit.mutate({ path, method: 'POST', body: at ? { at } : {}, edition: episode.edition })
  const out = episode.state === 'published' || episode.state === 'scheduled'
  return (
    <div className="sheet grid gap-5 p-5">
      <Standing episode={episode} />
      {edit.error && (
        <Notice tone="failed" title={edit.error.detail}>
          {edit.error.errors.map(({ path, message }) => (
            <p key={path}>{message}</p>
          ))}
        </Notice>
      )}
      {episode.state !== 'published' && (
        <div className="flex flex-wrap items-end gap-4">
          <Button disabled={!hydrated || !ready} onClick={() => send('/publish')} busy={edit.isPending && 'Working'}>
            Publish now
          </Button>
          <TextField
            label="Or at an hour"
            hint={`By the clock in ${episode.channel.timeZone.replaceAll('_', ' ')}.`}
            type="datetime-local"
            value={clock}
            onChange={(event) => setClock(event.target.value)}
          />
          <Button
            variant="line"
            disabled={!ready || clock === ''}
            onClick={() => send('/publish', momentOf(clock.slice(0, 16), episode.channel.timeZone).toISOString())}
          >
            Schedule
          </Button>
        </div>
      )}
      {!ready && !out && <p className="text-ink-2">The walk-round above still finds something to do.</p>}
      {out && (
        <Button variant="line" className="justify-self-start" disabled={!hydrated} onClick={() => send('/withdraw')}>
          {episode.state === 'scheduled' ? 'Take it off the calendar' : 'Withdraw'}
        </Button>
      )}
    </div>
  )
}
