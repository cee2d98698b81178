import type { NextAuthOptions } from 'next-auth'
import CredentialsProvider from 'next-auth/providers/credentials'
import EmailProvider from 'next-auth/providers/email'
import { env } from '@/lib/env'
import { adapter } from './adapter'
import { personByPassword, postSignInLink } from './sign-in'
import { endSession, isOpen, openSession, SESSION_SECONDS } from './sessions'

const LINK_SECONDS = 600

function build(): NextAuthOptions {
  return {
    secret: env().NEXTAUTH_SECRET,
    adapter,
    // next-auth cannot keep database sessions for passwords; so the cookie holds the id of a row of `sessions`.
    session: { strategy: 'jwt', maxAge: SESSION_SECONDS },
    pages: { signIn: '/sign-in', error: '/sign-in', verifyRequest: '/verify' },
    providers: [
      CredentialsProvider({
        id: 'password',
        name: 'Password',
        credentials: { email: {}, password: {} },
        authorize: (given) => personByPassword(given?.email ?? '', given?.password ?? ''),
      }),
      EmailProvider({
        server: env().SMTP_URL,
        from: env().MAIL_FROM,
        maxAge: LINK_SECONDS,
        sendVerificationRequest: ({ identifier, url }) => postSignInLink(identifier, url),
      }),
    ],
    callbacks: {
      async jwt({ token, user }) {
        return user ? { sub: user.id, name: user.name, sid: await openSession(user.id) } : token
      },
      async session({ session, token }) {
        if (typeof token.sid !== 'string' || !(await isOpen(token.sid))) return { expires: session.expires }
        return { expires: session.expires, user: { name: session.user?.name } }
      },
      // Addresses on our own site only; anything else goes home.
      redirect: ({ url, baseUrl }) =>
        /^\/(?![/\\])/.test(url)
          ? `${baseUrl}${url}`
          : URL.canParse(url) && new URL(url).origin === baseUrl
            ? url
            : baseUrl,
    },
    events: {
      async signOut({ token }) {
        if (typeof token?.sid === 'string') await endSession(token.sid)
      },
    },
  }
}

let built: NextAuthOptions | undefined

/** Built at the first request, not at import: a build has no settings. */
export const authOptions = (): NextAuthOptions => (built ??= build())
