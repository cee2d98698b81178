import multer from 'multer'
import { malformed } from '@/lib/errors'
import { readForm } from '@/lib/http/multipart'
import { type CaptionsForm, captionsForm } from './schema'

const MOST_BYTES = 5_000_000

/** Captions are small, so they are kept in memory, under every limit multer has. */
const upload = multer({
  storage: multer.memoryStorage(),
  limits: {
    fileSize: MOST_BYTES,
    files: 1,
    fields: 4,
    parts: 6,
    fieldSize: 1_000,
    fieldNameSize: 100,
    headerPairs: 20,
  },
  defParamCharset: 'utf8',
}).single('file')

export type CaptionsUpload = { form: CaptionsForm; sent: { bytes: Uint8Array; filename: string } }

/** Reads `file`, `language` and `kind` of a caption upload. @throws Problem 400, 413, 415 */
export async function readCaptionsUpload(request: Request): Promise<CaptionsUpload> {
  const { fields, files } = await readForm(upload, request, MOST_BYTES + 10_000)
  const [file] = files
  if (!file) throw malformed('The file is missing.', [{ path: 'file', message: 'Send a .vtt or .srt file.' }])
  const form = captionsForm.safeParse(fields)
  if (!form.success)
    throw malformed(
      'A field is not understood.',
      form.error.issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message })),
    )
  return { form: form.data, sent: { bytes: file.buffer, filename: file.originalname } }
}
