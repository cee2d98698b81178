import type { ReadCaptions } from './cues'
import { readSrt } from './srt'
import { captionLimits, readWebVtt } from './webvtt'

/** The bytes of a text file as text: by its byte order mark, else UTF-8 where it is valid, else windows-1252 as old editors write. */
export function decodeText(bytes: Uint8Array): string {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return new TextDecoder('utf-16le').decode(bytes)
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return new TextDecoder('utf-16be').decode(bytes)
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes)
  } catch {
    return decodeWindows1252(bytes)
  }
}

/** What windows-1252 puts where Latin-1 has control characters, 0x80 to 0x9F (WHATWG Encoding, index windows-1252). */
const windows1252 = '€\x81‚ƒ„…†‡ˆ‰Š‹Œ\x8dŽ\x8f\x90‘’“”•–—˜™š›œ\x9džŸ'

/** By hand, because Node 20's own decoder reads these as control characters (seen). */
const decodeWindows1252 = (bytes: Uint8Array): string =>
  Buffer.from(bytes)
    .toString('latin1')
    .replace(/[\x80-\x9f]/g, (letter) => windows1252[letter.charCodeAt(0) - 0x80] ?? letter)

/** Reads a caption file as WebVTT or SubRip, told apart by what is in it and only then by its name. */
export function readCaptionFile(bytes: Uint8Array, filename: string): ReadCaptions {
  if (bytes.length > captionLimits.bytes) {
    return {
      cues: [],
      errors: [{ line: 1, message: 'This file is too large to be captions; 5 MB at most are taken.' }],
      notes: [],
    }
  }
  const text = decodeText(bytes).replace(/^\uFEFF/, '')
  const isWebVtt = /^WEBVTT(?:[ \t\r\n]|$)/.test(text) || /\.vtt$/i.test(filename)
  return isWebVtt ? readWebVtt(text) : readSrt(text)
}
