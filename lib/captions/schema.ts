import { z } from 'zod'
import { languageTag, seconds } from '@/lib/episodes/schema'

export const captionKind = z.enum(['captions', 'subtitles', 'descriptions'])

/** The fields beside the file of an upload. */
export const captionsForm = z.object({ language: languageTag.default('en'), kind: captionKind.default('captions') })
export type CaptionsForm = z.infer<typeof captionsForm>

export const cuesInput = z.object({
  cues: z
    .array(
      z.object({
        start: seconds,
        end: seconds,
        text: z
          .string()
          .transform((value) => value.normalize('NFC').trim())
          .pipe(z.string().min(1).max(1000)),
        speaker: z.string().trim().max(80).nullish(),
      }),
    )
    .max(20_000),
  kind: captionKind.optional(),
  checked: z.boolean().optional(),
})
export type CuesInput = z.infer<typeof cuesInput>

/** `en`, or `en.vtt` for the file. */
export const languageOrFileParams = z.object({
  id: z.uuid(),
  language: z.string().regex(/^[a-zA-Z]{2,3}(-[a-zA-Z0-9]{2,8})*(\.vtt)?$/),
})
