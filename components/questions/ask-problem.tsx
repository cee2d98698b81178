import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import type { ApiProblem } from '@/lib/http/client'
import type { AskFormState } from '@/lib/questions/actions'

type Props = { state: AskFormState; failure: ApiProblem | null; here: string }

/** Why the question was not sent; what was written stays in the form. */
export function AskProblem({ state, failure, here }: Props) {
  const words = failure?.detail ?? state.problem
  if (!words) return null
  if (failure?.status === 0)
    return (
      <Notice tone="offline" title="The line is down">
        {words}
      </Notice>
    )
  return (
    <Notice tone="failed" title="The question was not sent.">
      {words}{' '}
      {state.signIn && !failure && (
        <Link href={`/sign-in?callbackUrl=${encodeURIComponent(here)}`} target="_blank">
          Sign in in another window, then send again
        </Link>
      )}
    </Notice>
  )
}
