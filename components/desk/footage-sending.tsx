import Link from 'next/link'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { Progress } from '@/components/ui/progress'
import { aboutWords, secondsLeft, sizeWords } from '@/lib/footage/rules'
import type { FilmSending, Sending } from './film-sending'

type Active = Extract<Sending, { sent: number }>

const refusals: Record<number, string> = {
  401: 'You were signed out. What was sent is safe. Sign in again in another window, then go on here.',
  403: 'Only the owner or an editor of this channel can send its films.',
  404: 'This upload is no longer here. It may have waited too long, or the episode is gone. Send the film from the start.',
  413: 'The film is larger than this installation takes. Export it at a smaller size and send that.',
}

function detailOf(state: Active): string {
  const amount = `${sizeWords(state.sent)} of ${sizeWords(state.total)}`
  if (state.phase !== 'sending' || state.pace === null) return amount
  const left = secondsLeft(state.sent, state.total, state.pace)
  return `${amount}, ${sizeWords(state.pace)} a second${left === null ? '' : `, ${aboutWords(left)} left`}`
}

/** What the server will never take is not offered again. */
const canGoOn = (state: Active) => state.phase !== 'failed' || ![403, 404, 413].includes(state.status)

const labels = { sending: 'Sending', paused: 'Paused:', offline: 'Waiting for the line:', failed: 'Stopped:' }

/** A film on its way, with how far, how fast and how long; and the ways to stop and go on. */
export function FootageSending({
  sending,
  state,
  onGone,
}: {
  sending: FilmSending
  state: Active
  onGone: () => void
}) {
  return (
    <div className="sheet grid gap-4 p-5">
      <Progress
        value={state.total > 0 ? state.sent / state.total : 0}
        label={`${labels[state.phase]} ${state.name}`}
        detail={detailOf(state)}
      />
      {state.phase === 'sending' && (
        <p className="max-w-measure text-sm text-ink-2">
          You can go on to chapters and captions meanwhile. Leave this window open; if the line breaks or the window is
          closed, it goes on later from where it was.
        </p>
      )}
      {state.phase === 'offline' && (
        <Notice tone="offline" title="The line is down.">
          What was sent is safe. Sending goes on by itself as soon as the line is back.
        </Notice>
      )}
      {state.phase === 'failed' && (
        <Notice
          tone="failed"
          title="The film was not taken."
          action={
            state.status === 401 && (
              <Link href="/sign-in" target="_blank">
                Sign in
              </Link>
            )
          }
        >
          {refusals[state.status] ?? 'The film could not be sent. What was sent is safe; try to go on.'}
        </Notice>
      )}
      <div className="flex flex-wrap gap-2.5">
        {state.phase === 'sending' || state.phase === 'offline' ? (
          <Button variant="line" onClick={sending.pause}>
            Pause
          </Button>
        ) : (
          canGoOn(state) && <Button onClick={sending.goOn}>Go on</Button>
        )}
        <Button variant="quiet" onClick={() => void sending.giveUp().then(onGone)}>
          Give up this upload
        </Button>
      </div>
    </div>
  )
}
