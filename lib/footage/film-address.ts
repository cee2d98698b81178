import { now } from '@/lib/clock'
import { env } from '@/lib/env'
import { signFolder } from '@/media/sign'

/** How long a private preview may be played from one page load. */
const PREVIEW_HOURS = 6

/** Where a film folder is served: plainly once it is public, else under a token that runs out. */
export function filmBase(folder: string, isPublic: boolean): string {
  if (isPublic) return `/media/films/${folder}`
  const until = new Date(now().getTime() + PREVIEW_HOURS * 3600_000)
  return `/media/signed/${signFolder(`films/${folder}`, until, env().MEDIA_SECRET)}/films/${folder}`
}
