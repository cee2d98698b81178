import NextAuth from 'next-auth'
import type { NextRequest } from 'next/server'
import { authOptions } from '@/lib/auth/next-auth'

type Context = { params: Promise<{ nextauth: string[] }> }

const answer = (request: NextRequest, context: Context) => NextAuth(request as never, context as never, authOptions())

export { answer as GET, answer as POST }
