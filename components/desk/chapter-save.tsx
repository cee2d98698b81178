import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import type { EpisodeEdit } from '@/lib/episodes/hooks'
import type { EpisodeView } from '@/lib/episodes/views'
import { ConflictNotice } from './conflict-notice'

type ChapterSaveProps = {
  edit: EpisodeEdit
  touched: boolean
  sound: boolean
  pressed: boolean
  onSave: () => void
  onTheirs: (current: EpisodeView) => void
  onMine: (current: EpisodeView) => void
}

export function ChapterSave({ edit, touched, sound, pressed, onSave, onTheirs, onMine }: ChapterSaveProps) {
  return (
    <div className="grid gap-3">
      <ConflictNotice problem={edit.error} what="chapters" onTheirs={onTheirs} onMine={onMine} />
      {pressed && !sound && <Notice tone="failed" title="A chapter above still needs its time or its title." />}
      {edit.isSuccess && !touched && <Notice tone="done" title="Chapters saved." />}
      <div className="flex flex-wrap items-center gap-4">
        <Button onClick={onSave} busy={edit.isPending && 'Saving'}>
          Save chapters
        </Button>
        {touched && <p className="text-sm text-ink-3">Not saved yet.</p>}
      </div>
    </div>
  )
}
