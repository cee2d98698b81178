import { FileStore } from '@tus/file-store'
import { Server } from '@tus/server'
import { env } from '@/lib/env'
import { services } from '@/lib/services'
import { keptDays } from './rules'
import { finishFootage } from './writes'

/** Carries the id that was given to the row; set by us on every request, whatever came in under this name. */
export const idHeader = 'x-turnrow-upload'

const extensions = ['creation', 'creation-with-upload', 'termination', 'expiration']
/** What OPTIONS says: the checksum is ours, in front of the server. */
export const offered = [...extensions, 'checksum'].join(',')

function build(): Server {
  const datastore = new FileStore({
    directory: services().storage.localPath('uploads'),
    expirationPeriodInMilliseconds: keptDays * 24 * 3600_000,
  })
  // An upload of unknown length cannot be held against a limit, and no camera sends one.
  datastore.extensions = extensions
  return new Server({
    path: '/api/footage',
    datastore,
    // Behind a proxy the server cannot know its own address.
    relativeLocation: true,
    allowedOrigins: [],
    maxSize: env().FOOTAGE_MAX_BYTES,
    disableTerminationForFinishedUploads: true,
    namingFunction: (request) => request.headers.get(idHeader) ?? '',
    onUploadFinish: async (_request, upload) => {
      await finishFootage(upload.id)
      return {}
    },
  })
}

// Next bundles routes apart; two servers would each have a lock of their own.
const shared = globalThis as unknown as { turnrowTus?: Server }

export const tus = (): Server => (shared.turnrowTus ??= build())
