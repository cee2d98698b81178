'use client'

import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { useEpisode, useEpisodeEdit } from '@/lib/episodes/hooks'
import type { EpisodeView } from '@/lib/episodes/views'
import { type Caution, whoComesFirst } from '@/lib/topics/cautions'

type ConfirmCautionsProps = { episode: EpisodeView; cautions: Caution[] }

/** The cautions that stand at the head of the episode, and the word of somebody at the desk that they were read. */
export function ConfirmCautions({ episode: first, cautions }: ConfirmCautionsProps) {
  const episode = useEpisode(first)
  const edit = useEpisodeEdit(episode.id)
  const confirm = (cautionsConfirmed: boolean) =>
    edit.mutate({ path: '', method: 'PATCH', body: { cautionsConfirmed }, edition: episode.edition })
  return (
    <section aria-labelledby="cautions" className="sheet grid gap-4 border-l-4 border-l-ink p-5">
      <h3 id="cautions">Cautions shown at the head of this episode</h3>
      <ul className="grid max-w-measure gap-3">
        {cautions.map(({ key, title, text, citation, status }) => (
          <li key={key}>
            <strong>{title}.</strong> {text}{' '}
            <span className="text-sm text-ink-3">
              {citation}
              {status === 'M' && ', from memory'}
            </span>
          </li>
        ))}
      </ul>
      <p className="max-w-measure font-semibold">{whoComesFirst}</p>
      {edit.error && <Notice tone="failed" title={edit.error.detail} />}
      {episode.cautionsConfirmed ? (
        <p>
          Confirmed.{' '}
          <Button variant="quiet" onClick={() => confirm(false)} busy={edit.isPending && 'Saving'}>
            Take it back
          </Button>
        </p>
      ) : (
        <Button className="justify-self-start" onClick={() => confirm(true)} busy={edit.isPending && 'Saving'}>
          I have read them and they fit what is shown
        </Button>
      )}
    </section>
  )
}
