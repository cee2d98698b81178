'use client'

import { signIn } from 'next-auth/react'
import { useRouter } from 'next/navigation'
import { useState, type FormEvent } from 'react'
import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { useHydrated } from '@/components/ui/use-hydrated'

/** What next-auth calls them, in our words. */
const failures: Record<string, string> = {
  CredentialsSignin: 'That address and password do not go together. After many wrong tries, wait a quarter of an hour.',
  Verification: 'That link has been used, or its ten minutes are over. Ask for a new one.',
  EmailSignin: 'The letter could not be sent. Wait a little, then ask again.',
}
const otherwise = 'Signing in did not work. Nothing is lost; please try again.'

type Way = 'password' | 'link'

export function SignInForm({ next, error }: { next: string; error: string | null }) {
  const router = useRouter()
  const hydrated = useHydrated()
  const [busy, setBusy] = useState<Way | null>(null)
  const [failure, setFailure] = useState(error ? (failures[error] ?? otherwise) : null)

  async function enter(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const submitter = (event.nativeEvent as SubmitEvent).submitter as HTMLButtonElement | null
    const way: Way = submitter?.value === 'link' ? 'link' : 'password'
    const form = new FormData(event.currentTarget)
    const given = { email: String(form.get('email')), password: String(form.get('password')) }
    setBusy(way)
    setFailure(null)
    const answer = await signIn(way === 'link' ? 'email' : 'password', {
      ...(way === 'link' ? { email: given.email } : given),
      redirect: false,
      callbackUrl: next,
    }).catch(() => undefined)
    if (answer?.ok && !answer.error) {
      if (way === 'link') router.push('/verify')
      // A whole new page: what was fetched for nobody must not be shown to somebody.
      else window.location.assign(next)
      return
    }
    setBusy(null)
    setFailure(answer?.error ? (failures[answer.error] ?? otherwise) : 'The line is down. Try again when it is back.')
  }

  return (
    <form onSubmit={enter} className="grid gap-5" method="post">
      {failure && <Notice tone="failed" title={failure} />}
      <TextField label="E-mail address" name="email" type="email" autoComplete="username" required maxLength={254} />
      <TextField label="Password" name="password" type="password" autoComplete="current-password" maxLength={256} />
      <div className="flex flex-wrap gap-2.5">
        <Button type="submit" value="password" disabled={!hydrated} busy={busy === 'password' && 'Signing in'}>
          Sign in
        </Button>
        <Button type="submit" value="link" variant="line" disabled={!hydrated} busy={busy === 'link' && 'Sending'}>
          Send me a link instead
        </Button>
      </div>
      <p className="text-sm text-ink-3">
        New here, or no password? Give your address and take the link: it signs you in, and keeps a place for you.
      </p>
    </form>
  )
}
