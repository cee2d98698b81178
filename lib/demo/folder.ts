import { resolve } from 'node:path'
import { env } from '@/lib/env'

/** Where spoken lines and drawn films are kept: beside the media, not in them, for they can be made again. */
export const demoFolder = (): string => resolve(env().MEDIA_ROOT, '..', 'demo')
