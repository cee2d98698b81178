import sharp from 'sharp'
import { MediaFailure } from './failure'

/** A photo as we keep it. Pixels. */
export type Photo = { bytes: Buffer; width: number; height: number }

/** About what a phone's best camera takes; a picture of more pixels than this is a bomb. */
const MOST_PIXELS = 50_000_000
/** The longer side as it is kept: enough to see a leaf spot, small enough for a poor line. */
const LONGEST_SIDE = 2048

type Kind = { name: string; begins: (bytes: Buffer) => boolean }

const ascii = (bytes: Buffer, from: number, to: number) => bytes.toString('latin1', from, to)

/** Told by their first bytes, not by the name or type that was sent: only these are given to a decoder. */
const taken: Kind[] = [
  { name: 'jpeg', begins: (bytes) => bytes[0] === 0xff && bytes[1] === 0xd8 && bytes[2] === 0xff },
  { name: 'png', begins: (bytes) => ascii(bytes, 0, 8) === '\x89PNG\r\n\x1a\n' },
  { name: 'webp', begins: (bytes) => ascii(bytes, 0, 4) === 'RIFF' && ascii(bytes, 8, 12) === 'WEBP' },
]

const isHeic = (bytes: Buffer) => ascii(bytes, 4, 8) === 'ftyp' && /^(hei|hev|mif1|msf1|avi)/.test(ascii(bytes, 8, 12))
const isDrawing = (bytes: Buffer) => /<svg[\s>]/i.test(ascii(bytes, 0, 1024))

function refuseKind(bytes: Buffer): void {
  if (taken.some(({ begins }) => begins(bytes))) return
  if (isHeic(bytes))
    throw new MediaFailure(
      'invalid',
      'heic',
      'HEIC photos cannot be read here. Set the camera to JPEG (“most compatible”), or send a screenshot of the photo.',
    )
  if (isDrawing(bytes)) throw new MediaFailure('invalid', 'drawing', 'A drawing (SVG) is not a photo. Send a JPEG.')
  throw new MediaFailure('invalid', 'no-photo', 'This is not a photo. Send a JPEG, PNG or WebP picture.')
}

/**
 * Draws a photo anew: upright, at most 2048 pixels long, as WebP, with nothing of what the camera wrote beside the
 * picture. What is kept is our own pixels, so place, owner and whatever was hidden behind the picture stay out.
 * @throws MediaFailure with a sentence for whoever sent it
 */
export async function redrawPhoto(bytes: Buffer): Promise<Photo> {
  refuseKind(bytes)
  try {
    const { data, info } = await sharp(bytes, { limitInputPixels: MOST_PIXELS, failOn: 'error' })
      .autoOrient()
      .resize({ width: LONGEST_SIDE, height: LONGEST_SIDE, fit: 'inside', withoutEnlargement: true })
      .webp({ quality: 80 })
      .toBuffer({ resolveWithObject: true })
    return { bytes: data, width: info.width, height: info.height }
  } catch (failure) {
    const technical = failure instanceof Error ? failure.message : String(failure)
    if (/pixel limit/i.test(technical))
      throw new MediaFailure('limit', 'too-many-pixels', 'A photo may have at most 50 million pixels.', technical)
    throw new MediaFailure('invalid', 'broken', 'The photo is broken or incomplete. Send it again.', technical)
  }
}
