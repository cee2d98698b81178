import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { Button } from '@/components/ui/button'

export const metadata: Metadata = { title: 'Sign in by mail', robots: { index: false }, referrer: 'no-referrer' }

/** A link in a letter leads here and not straight in: mail scanners follow links, and would use it up. */
export default async function VerifyPage({ searchParams }: PageProps<'/verify'>) {
  const { token, email, callbackUrl } = await searchParams
  if (typeof token !== 'string' || typeof email !== 'string')
    return (
      <PageHead
        title="Look in your mail"
        lead="A letter with a link is on its way to you. The link works once, for ten minutes. Nothing there? Look where unwanted mail is kept, or ask for another."
      />
    )
  return (
    <>
      <PageHead title="Sign in by mail" lead={<p>You asked for a link as {email}.</p>} />
      <form action="/api/auth/callback/email" method="get" className="mt-2">
        <input type="hidden" name="token" value={token} />
        <input type="hidden" name="email" value={email} />
        <input type="hidden" name="callbackUrl" value={typeof callbackUrl === 'string' ? callbackUrl : '/'} />
        <Button type="submit">Sign in</Button>
      </form>
    </>
  )
}
