import 'next-auth'

declare module 'next-auth' {
  /** What /api/auth/session tells the browser: a name, or nothing once the sign-in has ended on the server. */
  interface Session {
    expires: string
    user?: { name?: string | null }
  }
}
