'use client'

import { useState } from 'react'
import { Film } from '@/components/player/film'
import { PlaybackProvider } from '@/components/player/playback-context'
import { EmptyState } from '@/components/ui/empty-state'
import { useEpisode, useEpisodeEdit } from '@/lib/episodes/hooks'
import type { EpisodeView } from '@/lib/episodes/views'
import { type ChapterDraft, chaptersBody, draftsOf, isSound } from './chapter-draft'
import { ChapterList } from './chapter-list'
import { ChapterSave } from './chapter-save'
import { StartHere } from './start-here'
import { useUnsaved } from './use-unsaved'

/** Chapters beside the film: started at the second that is watched, or typed; saved as one list. */
export function ChaptersEditor({ episode: first }: { episode: EpisodeView }) {
  const episode = useEpisode(first)
  const [drafts, setDrafts] = useState(() => draftsOf(first))
  const [touched, setTouched] = useState(false)
  const [pressed, setPressed] = useState(false)
  const edit = useEpisodeEdit(episode.id)
  useUnsaved(touched)

  const change = (next: ChapterDraft[]) => {
    setDrafts(next)
    setTouched(true)
    edit.reset()
  }
  const settle = (current: EpisodeView) => {
    setDrafts(draftsOf(current))
    setTouched(false)
    setPressed(false)
  }
  const take = (current: EpisodeView) => {
    settle(current)
    edit.reset()
  }
  const save = (edition: number) => {
    setPressed(true)
    if (!drafts.every(isSound)) return
    edit.mutate({ path: '/chapters', method: 'PUT', body: chaptersBody(drafts), edition }, { onSuccess: settle })
  }

  return (
    <PlaybackProvider at={0} duration={episode.duration ?? 0}>
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]">
        <div className="sheet grid gap-0 lg:sticky lg:top-4">
          {episode.film ? (
            <Film title={episode.title} film={episode.film} captions={episode.captions} openAt={0} />
          ) : (
            <p className="p-5 text-ink-2">
              The film shows here as soon as its first size is made. Times can be typed now.
            </p>
          )}
          <StartHere drafts={drafts} onChange={change} />
        </div>
        <div className="grid gap-4">
          {drafts.length === 0 ? (
            <EmptyState title="No chapters yet">
              Play the film and press “Start a chapter here” where something new begins. Each chapter gets a title and
              what it is filed under: a crop stage, a field job or a subject.
            </EmptyState>
          ) : (
            <ChapterList drafts={drafts} faults={edit.error?.errors ?? []} strict={pressed} onChange={change} />
          )}
          <ChapterSave
            edit={edit}
            touched={touched}
            sound={drafts.every(isSound)}
            pressed={pressed}
            onSave={() => save(episode.edition)}
            onTheirs={take}
            onMine={(current) => save(current.edition)}
          />
        </div>
      </div>
    </PlaybackProvider>
  )
}
