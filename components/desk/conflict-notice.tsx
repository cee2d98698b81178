import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import type { EpisodeView } from '@/lib/episodes/views'
import type { ApiProblem } from '@/lib/http/client'

type ConflictNoticeProps = {
  problem: ApiProblem | null
  what: string
  onTheirs: (current: EpisodeView) => void
  onMine: (current: EpisodeView) => void
}

/** Why a save was refused. When somebody saved meanwhile, both versions are kept until one is chosen. */
export function ConflictNotice({ problem, what, onTheirs, onMine }: ConflictNoticeProps) {
  if (!problem) return null
  const current = problem.status === 412 ? (problem.body.current as EpisodeView | undefined) : undefined
  if (!current)
    return (
      <Notice tone={problem.status === 0 ? 'offline' : 'failed'} title={problem.detail}>
        {problem.errors.length > 1 && (
          <ul className="list-disc pl-5">
            {problem.errors.map(({ path, message }) => (
              <li key={path}>{message}</li>
            ))}
          </ul>
        )}
      </Notice>
    )
  return (
    <Notice
      tone="failed"
      title="Somebody else saved a newer version while you were working."
      action={
        <>
          <Button variant="line" onClick={() => onTheirs(current)}>
            Show theirs, drop mine
          </Button>
          <Button onClick={() => onMine(current)}>Save mine over it</Button>
        </>
      }
    >
      Your {what} still stand on this page and nothing of theirs was overwritten.
    </Notice>
  )
}
