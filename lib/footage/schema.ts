import { z } from 'zod'
import { malformed } from '@/lib/errors'

/** `/api/footage` and `/api/footage/{upload}`. */
export const uploadParams = z.object({ upload: z.array(z.string()).max(1).optional() })

/** `/media/films/{folder}/…` and `/media/signed/{token}/films/{folder}/…`. */
export const mediaParams = z.object({ path: z.array(z.string().max(200)).min(1).max(8) })

export const footageOutput = z.object({
  id: z.uuid(),
  state: z.enum(['receiving', 'inspecting', 'encoding', 'ready', 'failed']),
  progress: z.number().min(0).max(1),
  step: z.string().nullable(),
  filename: z.string(),
  bytes: z.number(),
  renditions: z.array(z.object({ height: z.number(), bitrate: z.number(), bytes: z.number(), ready: z.boolean() })),
  error: z.object({ code: z.string(), detail: z.string() }).optional(),
  received: z.number().optional(),
  duration: z.number().nullable(),
  notes: z.array(z.string()),
  preview: z.string().nullable(),
  isShown: z.boolean(),
})

/** The metadata a new upload comes with. `episodeId` says where it belongs. */
const metadata = z.object({
  episodeId: z.uuid(),
  filename: z.string().max(2000).optional(),
  filetype: z.string().optional(),
})
export type UploadMetadata = z.infer<typeof metadata>

/** Reads `Upload-Metadata` of tus 1.0.0: comma-separated pairs of a unique key and base64. @throws Problem 400 */
export function parseUploadMetadata(header: string | null): UploadMetadata {
  const pairs: Record<string, string> = {}
  for (const pair of (header ?? '').split(',').filter((text) => text.trim() !== '')) {
    const [key = '', value = '', ...rest] = pair.trim().split(' ')
    const isBase64 = /^(?:[A-Za-z0-9+/]{4})*(?:[A-Za-z0-9+/]{2}==|[A-Za-z0-9+/]{3}=)?$/.test(value)
    if (key === '' || rest.length > 0 || !isBase64 || Object.hasOwn(pairs, key))
      throw malformed('Upload-Metadata is not as tus 1.0.0 has it.')
    pairs[key] = Buffer.from(value, 'base64').toString('utf8')
  }
  const read = metadata.safeParse(pairs)
  if (read.success) return read.data
  throw malformed('Upload-Metadata must name the episode.', [
    { path: 'episodeId', message: 'the id of an episode of your channel' },
  ])
}
