import 'server-only'
import { notFound, redirect } from 'next/navigation'
import { Problem } from '@/lib/errors'

/**
 * A read on behalf of a page: not found becomes the page's own 404, not signed in the way to the door.
 * @param here the address to come back to after signing in
 * @throws whatever else the read throws, for the error page
 */
export async function forPage<T>(read: Promise<T>, here?: string): Promise<T> {
  try {
    return await read
  } catch (failure) {
    if (!(failure instanceof Problem)) throw failure
    // A cursor or an id that is none of ours was never an address here.
    if (failure.status === 404 || failure.status === 400) notFound()
    if (failure.status === 401) redirect(`/sign-in${here ? `?callbackUrl=${encodeURIComponent(here)}` : ''}`)
    throw failure
  }
}
