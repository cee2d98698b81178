import {
  WebVTTParser,
  type Cue as ParsedCue,
  type TreeNode,
  type TreeNodeObject,
  type TreeNodeObjectTagNameWithRt,
} from 'webvtt-parser'
import { escapeCueText, timestamp, type Cue, type LineFinding, type ReadCaptions } from './cues'

type Node = TreeNode<TreeNodeObjectTagNameWithRt>
type Tag = TreeNodeObject<TreeNodeObjectTagNameWithRt>

export const captionLimits = { bytes: 5_000_000, cues: 20_000, tagsPerCue: 200, lineLength: 5_000 } as const

/** With the semicolon: the parser's own table is without, and leaves it standing in the text (`&lt;` became `<;`). */
const entities = {
  '&amp;': '&',
  '&lt;': '<',
  '&gt;': '>',
  '&lrm;': '\u200e',
  '&rlm;': '\u200f',
  '&nbsp;': '\u00a0',
} as const

/** Faults that cost neither words nor times; the cue is read as the standard's parser reads it and written back clean. */
const harmless = [
  'No blank line after the signature.',
  'Cannot have timestamp in a comment.',
  'Cannot have timestamp in a style block.',
  'Style blocks cannot appear after the first cue.',
  'Blank line missing before cue.',
  'Start timestamp is not greater than or equal to start timestamp of previous cue.',
  'Timestamp not separated from',
  "'-->' not separated",
  'Incorrect escape.',
  'Incorrect end tag.',
  'Required end tag missing.',
  'Only <v> and <lang>',
  '<v> ',
  'Timestamp must be ',
  'Timestamp must not have trailing',
  ...['Duplicate setting.', 'No value for setting', 'Writing direction', 'Line position', 'Line alignment'],
  ...['Text position', 'Position alignment', 'Size ', 'Alignment ', 'Invalid setting.'],
]

/** Our words for what the parser says most often. */
const plainly: Record<string, string> = {
  'No valid signature. (File needs to start with "WEBVTT".)': 'The file must begin with the word WEBVTT.',
  'Cue identifier cannot be standalone.': 'These words belong to no time. Is there a blank line inside a caption?',
  'Cue identifier needs to be followed by timestamp.':
    'These words belong to no time. A line like 00:01.000 --> 00:04.000 must stand above them.',
  'End timestamp is not greater than start timestamp.': 'This caption ends before it begins.',
  'No decimal separator (".") found.': 'Write the thousandths after a full stop, as in 00:01.500.',
  'Incorrect start tag.': 'This mark-up is not known in captions. Known are b, i, u, v, c, lang and ruby.',
  'No valid timestamp separator found.': 'The two times must be parted by -->.',
  'No timestamp found.': 'The time is missing.',
}

const isTextFault = (message: string) => /tag|escape|annotation|<v>|^Timestamp must be/.test(message)

/**
 * Reads WebVTT through the W3C's own parser. STYLE and REGION blocks are left out (styles can fetch addresses), comments too.
 * Nothing throws: what cannot be read is in `errors`, by line.
 */
export function readWebVtt(source: string): ReadCaptions {
  const lines = source.replaceAll('\0', '\uFFFD').split(/\r\n|\r|\n/)
  const tooMuch = overLimits(lines)
  if (tooMuch) return { cues: [], errors: [tooMuch], notes: [] }
  const readable = withoutRegions(lines)
  const parsed = new WebVTTParser(entities).parse(readable.join('\n'), 'subtitles')
  const found = parsed.errors.map((error) => ({ line: lineOf(error, readable), message: error.message }))
  const errors = found.filter(({ message }) => !isHarmless(message))
  const cues = parsed.cues.map(cueOf)
  if (cues.length === 0 && errors.length === 0) errors.push({ line: 1, message: 'There is no caption in this file.' })
  return {
    cues,
    errors: errors.map(inPlainWords),
    notes: found.filter(({ message }) => isHarmless(message)).map(inPlainWords),
  }
}

const isHarmless = (message: string) => harmless.some((start) => message.startsWith(start))
const inPlainWords = ({ line, message }: LineFinding): LineFinding => ({ line, message: plainly[message] ?? message })

/** The parser recurses into tags and reads long files in one go, so both are bounded before it sees them. */
function overLimits(lines: string[]): LineFinding | null {
  let tags = 0
  let times = 0
  for (const [index, line] of lines.entries()) {
    tags = line === '' ? 0 : tags + line.split('<').length - 1
    if (line.includes('-->')) times += 1
    if (line.length > captionLimits.lineLength)
      return { line: index + 1, message: 'This line is too long to be a caption.' }
    if (tags > captionLimits.tagsPerCue)
      return { line: index + 1, message: 'There is too much mark-up in this caption.' }
    if (times > captionLimits.cues)
      return { line: index + 1, message: `More than ${captionLimits.cues} captions are not taken.` }
  }
  return null
}

/** Regions are in the standard, yet the parser calls them faults; HLS adds a header line of its own. Blanked, so that line numbers stay. */
function withoutRegions(lines: string[]): string[] {
  let inRegion = false
  return lines.map((line, index) => {
    if (line === '') inRegion = false
    if (/^REGION[ \t]*$/.test(line) && lines[index - 1] === '') inRegion = true
    if (inRegion || (index < 5 && line.startsWith('X-TIMESTAMP-MAP='))) return ''
    return line.includes('-->') ? line.replace(/[ \t]region:\S+/g, '') : line
  })
}

/** Faults in cue text are reported at the line after the cue, with a column into its text; this finds the line meant. */
function lineOf(error: { message: string; line: number; col?: number }, lines: string[]): number {
  // Said of a line once the next one has been looked at.
  if (error.message.startsWith('Cue identifier')) return error.line - 1
  if (!isTextFault(error.message)) return Math.min(error.line, lines.length)
  const last = error.line - 1
  let first = last
  while (first > 1 && !lines[first - 2]?.includes('-->')) first -= 1
  let offset = (error.col ?? 1) - 1
  let line = first
  while (line < last && offset > (lines[line - 1]?.length ?? 0)) {
    offset -= (lines[line - 1]?.length ?? 0) + 1
    line += 1
  }
  return line
}

function cueOf(parsed: ParsedCue): Cue {
  const nodes = parsed.tree.children
  return {
    startMs: Math.round(parsed.startTime * 1000),
    endMs: Math.round(parsed.endTime * 1000),
    text: nodes.map(markup).join(''),
    plain: nodes.map(words).join('').trim(),
    speaker: speakerIn(nodes),
    settings: settingsOf(parsed),
  }
}

function markup(node: Node): string {
  if (node.type === 'text') return escapeCueText(node.value)
  if (node.type === 'timestamp') return `<${timestamp(Math.round(node.value * 1000))}>`
  const classes = node.classes.map((name) => `.${name}`).join('')
  const annotation = node.value ? ` ${escapeCueText(node.value)}` : ''
  return `<${node.name}${classes}${annotation}>${node.children.map(markup).join('')}</${node.name}>`
}

function words(node: Node): string {
  if (node.type === 'text') return node.value
  // What stands above ruby text is a reading aid; in running text it would double the word.
  return node.type === 'object' && node.name !== 'rt' ? node.children.map(words).join('') : ''
}

function speakerIn(nodes: Node[]): string | null {
  const voice = nodes.find((node): node is Tag => node.type === 'object' && node.name === 'v' && node.value !== '')
  return voice ? voice.value : null
}

function settingsOf(cue: ParsedCue): string {
  const percent = cue.snapToLines ? '' : '%'
  const said: [boolean, string][] = [
    [cue.direction !== 'horizontal', `vertical:${cue.direction}`],
    [
      cue.linePosition !== 'auto',
      `line:${cue.linePosition}${percent}${cue.lineAlign === 'start' ? '' : `,${cue.lineAlign}`}`,
    ],
    [
      cue.textPosition !== 'auto',
      `position:${cue.textPosition}%${cue.positionAlign === 'auto' ? '' : `,${cue.positionAlign}`}`,
    ],
    [cue.size !== 100, `size:${cue.size}%`],
    [cue.alignment !== 'center', `align:${cue.alignment}`],
  ]
  return said.flatMap(([applies, setting]) => (applies ? [setting] : [])).join(' ')
}

/** Writes captions as WebVTT. A blank line would end a cue, so none is let into one. */
export function writeWebVtt(cues: readonly Pick<Cue, 'startMs' | 'endMs' | 'text' | 'settings'>[]): string {
  const blocks = cues.map(({ startMs, endMs, text, settings }) => {
    const times = `${timestamp(startMs)} --> ${timestamp(endMs)}${settings ? ` ${settings}` : ''}`
    return `${times}\n${text.replace(/\r\n?/g, '\n').replace(/\n{2,}/g, '\n')}`
  })
  return ['WEBVTT', ...blocks, ''].join('\n\n').replace(/\n+$/, '\n')
}

/** Writes chapters as WebVTT (kind `chapters`): titles are plain text without tags. */
export function writeChaptersVtt(chapters: readonly { startMs: number; endMs: number; title: string }[]): string {
  return writeWebVtt(
    chapters.map(({ title, ...times }) => ({
      ...times,
      text: escapeCueText(title.replace(/\s+/g, ' ').trim()),
      settings: '',
    })),
  )
}
