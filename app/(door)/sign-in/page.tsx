import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { SignInForm } from '@/components/door/sign-in-form'
import { PageHead } from '@/components/frame/page-head'
import { currentActor } from '@/lib/auth/current'
import { wayBack } from '@/lib/auth/way-back'

export const metadata: Metadata = { title: 'Sign in', robots: { index: false } }

export default async function SignInPage({ searchParams }: PageProps<'/sign-in'>) {
  const { callbackUrl, error } = await searchParams
  const next = wayBack(callbackUrl)
  if ((await currentActor()).id !== null) redirect(next)
  return (
    <>
      <PageHead title="Sign in" lead="To ask, to say that you are asking too, or to work at a farm’s desk." />
      <SignInForm next={next} error={typeof error === 'string' ? error : null} />
    </>
  )
}
