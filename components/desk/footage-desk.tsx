'use client'

import { useEffect } from 'react'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { useFootage, useFootageChanged, useRetryFootage } from '@/lib/footage/hooks'
import type { FootageStatus } from '@/lib/footage/views'
import { cleanFilename, sizeWords } from '@/lib/footage/rules'
import { FootageDrop } from './footage-drop'
import { FootageFilm } from './footage-film'
import { FootageSending } from './footage-sending'
import { useSending } from './use-sending'

type FootageDeskProps = { episodeId: string; first: FootageStatus | null; hasFilm: boolean; maySend: boolean }

const firstHint =
  'The file from the phone or camera itself: MP4, MOV, MKV, WebM, AVI or MTS, up to six hours. On a metered line, mind that the whole file is sent once.'

function dropWords(footage: FootageStatus | null | undefined, hasFilm: boolean) {
  if (footage?.state === 'receiving') {
    return {
      title: `Go on with ${footage.filename}`,
      hint: `${sizeWords(footage.received ?? 0)} of ${sizeWords(footage.bytes)} have arrived. Choose the same file to go on from there, or another to begin anew.`,
      choose: 'Choose the file again',
    }
  }
  if (!footage) return { title: 'Drop the film here', hint: firstHint, choose: 'Choose a film' }
  return {
    title: 'Send another film in its place',
    hint: `${hasFilm ? 'The film that is shown now stays until the new one is whole. ' : ''}Chapters, captions and readings are kept as they are.`,
    choose: 'Choose a film',
  }
}

/** The footage step: send a film, see it being made, replace it. */
export function FootageDesk({ episodeId, first, hasFilm, maySend }: FootageDeskProps) {
  const { footage, isLost } = useFootage(episodeId, first)
  const { sending, state } = useSending(episodeId)
  const changed = useFootageChanged(episodeId)
  useEffect(() => {
    if (state.phase === 'arrived') void changed().then(sending.clear)
  }, [state.phase, changed, sending])

  const take = (file: File) => {
    const isSame =
      footage?.state === 'receiving' && footage.filename === cleanFilename(file.name) && footage.bytes === file.size
    sending.start(file, isSame ? footage.id : null)
  }
  const isSending = 'sent' in state
  return (
    <div className="grid gap-5">
      {isLost && (
        <Notice tone="offline" title="The line is down.">
          This page shows what was known last. It goes on by itself when the line is back.
        </Notice>
      )}
      {isSending && <FootageSending sending={sending} state={state} onGone={() => void changed()} />}
      {footage?.state === 'failed' && !isSending && (
        <Failed episodeId={episodeId} footage={footage} maySend={maySend} />
      )}
      {footage && !['receiving', 'failed'].includes(footage.state) && <FootageFilm footage={footage} />}
      {maySend && !isSending && <FootageDrop {...dropWords(footage, hasFilm)} onFile={take} />}
      {!maySend && !footage && (
        <p className="text-ink-2">No film has been sent yet. The owner or an editor sends it.</p>
      )}
    </div>
  )
}

function Failed({ episodeId, footage, maySend }: { episodeId: string; footage: FootageStatus; maySend: boolean }) {
  const retry = useRetryFootage(episodeId)
  return (
    <Notice
      tone="failed"
      title={`${footage.filename} could not be used.`}
      action={
        maySend && (
          <Button variant="line" busy={retry.isPending && 'Trying'} onClick={() => retry.mutate()}>
            Try the same file again
          </Button>
        )
      }
    >
      <p>{retry.error?.detail ?? footage.error?.detail}</p>
    </Notice>
  )
}
