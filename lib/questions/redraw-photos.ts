import { createHash } from 'node:crypto'
import { unprocessable } from '@/lib/errors'
import { MediaFailure } from '@/media/failure'
import { type Photo, redrawPhoto } from '@/media/photos'

/** A photo drawn anew and not kept yet. As JSON it is its hash: that is how two sendings are told to be the same. */
export type DrawnPhoto = Photo & { toJSON: () => string }

const drawn = (photo: Photo): DrawnPhoto => ({
  ...photo,
  toJSON: () => createHash('sha256').update(photo.bytes).digest('hex'),
})

/** @throws Problem 422 that names the photo and says what to do */
export async function redrawPhotos(sent: readonly { buffer: Buffer; originalname: string }[]): Promise<DrawnPhoto[]> {
  const photos: DrawnPhoto[] = []
  // One after the other: four at once would hold four whole pictures in memory.
  for (const [index, { buffer, originalname }] of sent.entries()) {
    const photo = await redrawPhoto(buffer).catch((failure: unknown) => {
      if (!(failure instanceof MediaFailure)) throw failure
      throw unprocessable(`“${originalname.slice(0, 80)}”: ${failure.reason}`, [
        { path: `photos.${index}`, message: failure.reason },
      ])
    })
    photos.push(drawn(photo))
  }
  return photos
}
