/**
 * The address of the sound alone, from an HLS master playlist (RFC 8216, 4.3.4): a variant without a picture, else the
 * audio rendition. Null when the playlist has neither.
 */
export function listenOnlyAddress(master: string, base: string): string | null {
  const lines = master.split(/\r?\n/)
  for (const [at, line] of lines.entries()) {
    const next = lines[at + 1]
    if (line.startsWith('#EXT-X-STREAM-INF:') && isSoundOnly(line) && next) return new URL(next.trim(), base).href
  }
  for (const line of lines) {
    const uri = /^#EXT-X-MEDIA:(?=.*TYPE=AUDIO).*URI="([^"]+)"/.exec(line)?.[1]
    if (uri) return new URL(uri, base).href
  }
  return null
}

function isSoundOnly(variant: string): boolean {
  const codecs = /CODECS="([^"]*)"/.exec(variant)?.[1]
  if (/[:,]RESOLUTION=/.test(variant) || !codecs) return false
  return codecs.split(',').every((codec) => /^\s*(mp4a|ac-3|ec-3|opus|flac)/i.test(codec))
}
