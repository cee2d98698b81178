import multer from 'multer'
import { malformed, tooLarge } from '@/lib/errors'
import { readForm } from '@/lib/http/multipart'
import { checkJson, parseJson } from '@/lib/http/parse'
import { PHOTO_BYTES_MOST, PHOTOS_MOST } from './limits'
import { redrawPhotos } from './redraw-photos'
import { askForm, type Asking } from './schema'

/** Photos pass through memory, under every limit multer has; only what is drawn anew is kept. */
const upload = multer({
  storage: multer.memoryStorage(),
  limits: {
    fileSize: PHOTO_BYTES_MOST,
    files: PHOTOS_MOST,
    fields: 8,
    parts: 12,
    fieldSize: 20_000,
    fieldNameSize: 40,
    headerPairs: 20,
  },
  defParamCharset: 'utf8',
}).array('photos', PHOTOS_MOST)

const MOST = PHOTOS_MOST * PHOTO_BYTES_MOST + 100_000

/** A form has no numbers and no nulls: what is empty was left out, and the second is read as one. */
function fieldsAsJson(fields: Record<string, string>): string {
  const given = Object.entries(fields).filter(([, value]) => value !== '')
  return JSON.stringify(Object.fromEntries(given.map(([name, value]) => [name, name === 'at' ? Number(value) : value])))
}

/**
 * Reads `POST /api/questions`, as JSON or as a form with up to four `photos`.
 * @throws Problem 400 malformed, 413 too large, 415 other types, 422 against a rule or no photo
 */
export async function readAsking(request: Request): Promise<Asking> {
  const type = request.headers.get('content-type') ?? ''
  if (!type.startsWith('multipart/')) return parseJson(askForm, request)
  const { fields, files } = await readForm(upload, request, MOST).catch((failure: unknown) => {
    const { status } = (failure ?? {}) as { status?: number }
    throw status === 413 ? tooLarge(`A photo may have at most ${PHOTO_BYTES_MOST / 1024 / 1024} MB.`) : failure
  })
  if (files.some(({ fieldname }) => fieldname !== 'photos')) throw malformed('Photos go into the field “photos”.')
  const { input } = checkJson(askForm, fieldsAsJson(fields))
  return { input, photos: await redrawPhotos(files) }
}
