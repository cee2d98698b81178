import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { PageHead } from '@/components/frame/page-head'
import { OtherSignIns } from '@/components/people/other-sign-ins'
import { SelfForm } from '@/components/people/self-form'
import { TokenList } from '@/components/people/token-list'
import { currentActor } from '@/lib/auth/current'
import { readTokens } from '@/lib/people/reads'

export const metadata: Metadata = { title: 'Your account', robots: { index: false } }

export default async function AccountPage() {
  const actor = await currentActor()
  if (actor.id === null) redirect('/sign-in?callbackUrl=/account')
  return (
    <div className="page grid gap-6">
      <PageHead title="Your account" />
      <SelfForm name={actor.name} units={actor.units} />
      <section aria-labelledby="sign-ins" className="grid gap-3">
        <h2 id="sign-ins">Sign-ins</h2>
        <OtherSignIns />
      </section>
      <section aria-labelledby="tokens" className="grid gap-3">
        <h2 id="tokens">Tokens for scripts</h2>
        <TokenList tokens={await readTokens(actor)} />
      </section>
    </div>
  )
}
