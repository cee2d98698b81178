import { escapeCueText, timestamp, type LineFinding, type ReadCaptions } from './cues'
import { captionLimits, readWebVtt } from './webvtt'

/**
 * SubRip has no standard, only habits: counters or none, hours or none, a comma or a full stop, one to three digits behind
 * it, places on the screen after the times. Only the timing line is trusted; all else is text between two of them.
 */
const timing =
  /^\s*(?:(\d{1,3}):)?(\d{1,2}):(\d{1,2})(?:[,.](\d{1,3}))?\s*-->\s*(?:(\d{1,3}):)?(\d{1,2}):(\d{1,2})(?:[,.](\d{1,3}))?(?:\s.*)?$/

type Block = { line: number; startMs: number; endMs: number; lines: string[] }

/** `,5` is half a second, not five thousandths. */
const milliseconds = ([hours = '0', minutes = '0', seconds = '0', rest = '0']: (string | undefined)[]) =>
  ((Number(hours) * 60 + Number(minutes)) * 60 + Number(seconds)) * 1000 + Number(rest.padEnd(3, '0'))

/** Reads SubRip into the same cues that WebVTT gives. What cannot be read is in `errors`, by line. */
export function readSrt(source: string): ReadCaptions {
  const errors: LineFinding[] = []
  const blocks = blocksOf(source.replaceAll('\0', '\uFFFD').split(/\r\n|\r|\n/), errors)
  if (blocks.length > captionLimits.cues)
    errors.push({ line: 1, message: `More than ${captionLimits.cues} captions are not taken.` })
  if (blocks.length === 0 && errors.length === 0) errors.push({ line: 1, message: 'There is no caption in this file.' })
  for (const block of blocks) {
    if (block.endMs <= block.startMs) errors.push({ line: block.line, message: 'This caption ends before it begins.' })
  }
  if (errors.length > 0) return { cues: [], errors, notes: [] }
  const ordered = [...blocks].sort((a, b) => a.startMs - b.startMs)
  const read = readWebVtt(['WEBVTT', ...ordered.map(asWebVtt), ''].join('\n\n'))
  return { ...read, notes: [] }
}

function blocksOf(lines: string[], errors: LineFinding[]): Block[] {
  const blocks: Block[] = []
  lines.forEach((text, index) => {
    const times = timing.exec(text)?.slice(1)
    if (times) {
      dropCounter(blocks.at(-1)?.lines)
      blocks.push({
        line: index + 1,
        startMs: milliseconds(times.slice(0, 4)),
        endMs: milliseconds(times.slice(4)),
        lines: [],
      })
    } else if (/^\s*[\d:.,\s]*-->/.test(text)) {
      errors.push({
        line: index + 1,
        message: 'These times cannot be read. They look like 00:00:01,500 --> 00:00:04,000.',
      })
    } else {
      blocks.at(-1)?.lines.push(text)
    }
  })
  return blocks
}

/** The number of the next caption stands alone above its times, behind a blank line; it is no part of what was said before. */
function dropCounter(lines: string[] | undefined): void {
  if (!lines || !/^\s*\d+\s*$/.test(lines.at(-1) ?? '')) return
  if (lines.length === 1 || (lines.at(-2) ?? '').trim() === '') lines.pop()
}

function asWebVtt(block: Block): string {
  const text = block.lines.map((line) => clean(line.trim())).filter((line) => line !== '')
  return [`${timestamp(block.startMs)} --> ${timestamp(block.endMs)}`, ...text].join('\n')
}

const kept = /^<(\/?)([biu])>$/i

/** Keeps bold, italic and underline; drops fonts, colours and {\…} commands; everything else is text and is escaped. */
function clean(line: string): string {
  return line
    .replace(/\{\\[^}]*\}/g, '')
    .split(/(<\/?[a-zA-Z][^<>]*>)/)
    .map((piece, index) => {
      if (index % 2 === 0) return escapeCueText(piece)
      const tag = kept.exec(piece)
      return tag ? `<${tag[1]}${tag[2]?.toLowerCase()}>` : ''
    })
    .join('')
}
