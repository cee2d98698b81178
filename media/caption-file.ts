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
    return new TextDecoder('windows-1252').decode(bytes)
  }
}

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
