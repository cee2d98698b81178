import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import type { ApiProblem } from '@/lib/http/client'
import type { SeasonView } from '@/lib/seasons/views'

type SaveNoticeProps = {
  failed: boolean
  problem: ApiProblem | null
  theirs: SeasonView | undefined
  onTakeTheirs: (view: SeasonView) => void
  onSaveOver: (edition: number) => void
}

const lanes = (count: number) => `${count} ${count === 1 ? 'lane' : 'lanes'}`

/** Why the season was not saved, and what to do; nothing when all is well. */
export function SaveNotice({ failed, problem, theirs, onTakeTheirs, onSaveOver }: SaveNoticeProps) {
  if (!failed) return null
  if (theirs) {
    return (
      <Notice
        className="mb-3"
        tone="failed"
        title="Somebody else saved this season meanwhile"
        action={
          <>
            <Button variant="line" onClick={() => onTakeTheirs(theirs)}>
              Take theirs
            </Button>
            <Button variant="line" onClick={() => onSaveOver(theirs.edition)}>
              Save mine over it
            </Button>
          </>
        }
      >
        Nothing of theirs was overwritten, and yours is still on this page. Theirs has {lanes(theirs.plantings.length)}.
      </Notice>
    )
  }
  if (problem?.status === 0) {
    return (
      <Notice className="mb-3" tone="offline" title="The line is down">
        What you wrote is still on this page. Save again when the line is back.
      </Notice>
    )
  }
  return (
    <Notice className="mb-3" tone="failed" title="The season was not saved">
      {problem?.detail ?? 'Something failed on the way.'} What you wrote is still on this page.
    </Notice>
  )
}
