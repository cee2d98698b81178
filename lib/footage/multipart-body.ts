import { randomBytes } from 'node:crypto'
import type { Readable } from 'node:stream'
import { contentRange, type ByteRange } from '@/media/ranges'

/** Several ranges in one answer, as multipart/byteranges (RFC 9110 section 14.6). */
export function multipart(
  partType: string,
  size: number,
  ranges: readonly ByteRange[],
  open: (range: ByteRange) => Promise<Readable>,
): { type: string; body: AsyncGenerator<Buffer> } {
  const boundary = randomBytes(12).toString('hex')
  async function* body(): AsyncGenerator<Buffer> {
    for (const range of ranges) {
      const head = [`--${boundary}`, `Content-Type: ${partType}`, `Content-Range: ${contentRange(range, size)}`, '', '']
      yield Buffer.from(head.join('\r\n'))
      yield* await open(range)
      yield Buffer.from('\r\n')
    }
    yield Buffer.from(`--${boundary}--\r\n`)
  }
  return { type: `multipart/byteranges; boundary=${boundary}`, body: body() }
}
