import { createHash, randomUUID } from 'node:crypto'
import { createReadStream, createWriteStream } from 'node:fs'
import { mkdir, rm } from 'node:fs/promises'
import { join } from 'node:path'
import { Readable, Transform } from 'node:stream'
import { pipeline } from 'node:stream/promises'
import type { ReadableStream } from 'node:stream/web'
import { malformed, Problem, tooLarge } from '@/lib/errors'

/** tus 1.0.0, checksum extension: sha1 is a must. */
export const checksumAlgorithms = ['sha1', 'sha256'] as const

type Checksum = { algorithm: string; digest: Buffer }

/** @throws Problem 400 for an algorithm that is not offered, as the extension asks */
export function parseChecksum(header: string | null): Checksum | null {
  if (header === null) return null
  const [algorithm = '', encoded = ''] = header.trim().split(' ')
  if (!(checksumAlgorithms as readonly string[]).includes(algorithm))
    throw malformed('This checksum algorithm is not offered.')
  return { algorithm, digest: Buffer.from(encoded, 'base64') }
}

const mismatch = () =>
  new Problem(460, 'Checksum mismatch', 'The chunk arrived changed and was thrown away. Send it again.')

/**
 * Sets a chunk aside, holds it against its checksum and only then lets it go on: what does not match never touches the upload.
 * @param room most bytes that the chunk may have; more is refused before it fills the disk
 * @throws Problem 460, 413
 */
export async function withCheckedChunk<T>(
  request: Request,
  checksum: Checksum,
  folder: string,
  room: number,
  goOn: (body: ReadableStream<Uint8Array>) => Promise<T>,
): Promise<T> {
  await mkdir(folder, { recursive: true })
  const path = join(folder, randomUUID())
  const hash = createHash(checksum.algorithm)
  let bytes = 0
  const meter = new Transform({
    transform(chunk: Buffer, _encoding, done) {
      bytes += chunk.length
      hash.update(chunk)
      done(bytes > room ? tooLarge('The chunk is longer than what is left of the upload.') : null, chunk)
    },
  })
  try {
    const body = request.body as unknown as ReadableStream<Uint8Array> | null
    await pipeline(body ? Readable.fromWeb(body) : Readable.from([]), meter, createWriteStream(path, { flags: 'wx' }))
    if (!hash.digest().equals(checksum.digest)) throw mismatch()
    return await goOn(Readable.toWeb(createReadStream(path)) as ReadableStream<Uint8Array>)
  } finally {
    await rm(path, { force: true })
  }
}
