import { receiveFootage } from '@/lib/footage/receive'
import { uploadParams } from '@/lib/footage/schema'
import { endpoint } from '@/lib/http/endpoint'

const tus = (summary: string) =>
  endpoint({ summary, params: uploadParams, body: 'raw' }, ({ actor, params, request }) =>
    receiveFootage(actor, request, params.upload?.[0]),
  )

export const OPTIONS = tus('What of tus 1.0.0 is spoken here')
export const POST = tus('Begin an upload of footage (tus 1.0.0)')
export const HEAD = tus('How much of an upload has arrived')
export const PATCH = tus('Send the next bytes of an upload')
export const DELETE = tus('Give up an unfinished upload')
