import { randomUUID } from 'node:crypto'
import { inTransaction } from '@/lib/db'
import { env } from '@/lib/env'
import { post } from '@/lib/mail/outbox'
import { User } from '@/models/user'
import { passwordFits } from './passwords'
import { countTry, forgetTries, limitTries, triesSoFar } from './throttle'

const FAILURES = { most: 20, seconds: 900 }
const LINKS = { most: 5, seconds: 900 }

/** @returns the person, or null for a wrong address, a wrong password or somebody who is disabled: all look the same */
export async function personByPassword(email: string, password: string) {
  const address = email.trim().toLowerCase()
  const key = `sign-in:${address}`
  if ((await triesSoFar(key, FAILURES)) >= FAILURES.most) return null
  const user = await User.findOne({ where: { email: address } })
  const fits = await passwordFits(user?.passwordHash, password)
  if (!user || !fits || user.disabledAt) {
    await countTry(key, FAILURES)
    return null
  }
  await forgetTries(key)
  return { id: user.id, name: user.name, email: user.email }
}

/**
 * Puts the sign-in letter in the outbox. The link opens a page with a button, because mail scanners follow links
 * and would use it up.
 * @throws Problem 429 when too many were asked for
 */
export async function postSignInLink(address: string, callback: string): Promise<void> {
  await limitTries(`link:${address}`, LINKS)
  const link = new URL('/verify', env().BASE_URL)
  link.search = new URL(callback).search
  await inTransaction((transaction) =>
    post(
      {
        key: `sign-in:${randomUUID()}`,
        to: { address },
        subject: 'Your link to sign in to Turnrow',
        text: [
          'Open this page and press “Sign in”. The link works once, for ten minutes:',
          '',
          link.href,
          '',
          'If you did not ask for it, nothing needs doing.',
        ].join('\n'),
      },
      { transaction },
    ),
  )
}
