import 'server-only'
import { headers } from 'next/headers'
import { cache } from 'react'
import type { Actor } from './actor'
import { actorOfHeaders } from './actor-of-request'

/** Who is looking at this page; asked of the database once per request. */
export const currentActor = cache(async (): Promise<Actor> => actorOfHeaders(new Headers(await headers())))
