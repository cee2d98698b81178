import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { dirname, join } from 'node:path'
import { captionText } from '@/lib/demo/caption-text'
import { momentOf, type CutSheet } from '@/lib/demo/cut-sheet'
import { drawFilm } from '@/lib/demo/draw-films'
import type { StoryChapter, StoryEpisode } from '@/lib/demo/story/types'
import { voiceLines } from '@/lib/demo/voice-lines'

/** A film with real speech, made for the test: where it lies, its captions, and when what is said. */
export type Clip = { path: string; captions: string; sheet: CutSheet; chapters: StoryChapter[] }

const blank: Omit<StoryEpisode, 'key' | 'chapters'> = {
  channel: 'alder-fork',
  number: 1,
  title: '',
  slug: '',
  summary: '',
  season: '2026',
  filmedOn: '2026-11-28',
  publishedOn: null,
  state: 'draft',
}

const stubble: StoryChapter[] = [
  {
    title: 'What the combine left',
    topics: ['wheat-99', 'job-harvest'],
    scene: 'combine',
    lines: [
      { text: 'The residue lies in a windrow behind the combine.', key: 'windrow' },
      { text: 'A drill rides over a mat like that.', key: 'mat' },
    ],
  },
  {
    title: 'One pass before frost',
    topics: ['job-tillage', 'soil'],
    scene: 'tillage-pass',
    lines: [
      { text: 'So we make one shallow pass before frost.', key: 'pass' },
      { text: 'Volunteer wheat sprouts within the fortnight.' },
    ],
  },
]

const volunteers: StoryChapter[] = [
  {
    title: 'A fortnight later',
    topics: ['soil', 'subject-weeds'],
    scene: 'frost-field',
    lines: [{ text: 'A fortnight later the stubble is green.' }],
  },
  {
    title: 'Your question about the mat',
    topics: ['wheat-00', 'job-drilling'],
    scene: 'tillers',
    lines: [
      { text: 'You asked how thick a mat a drill can take.', key: 'question' },
      { text: 'If you cannot see the soil through it, spread it first.', key: 'answer' },
    ],
  },
]

async function makeClip(key: string, chapters: StoryChapter[]): Promise<Clip> {
  const folder = await mkdtemp(join(tmpdir(), 'turnrow-clip-'))
  const episode = { ...blank, key, chapters }
  const voiced = await voiceLines(episode, 'nell', folder)
  const path = await drawFilm(episode, voiced, folder)
  return { path, captions: captionText(voiced.sheet), sheet: voiced.sheet, chapters }
}

/** The film that raises a question. */
export const stubbleClip = () => makeClip('stubble', stubble)
/** The film that answers it. */
export const volunteersClip = () => makeClip('volunteers', volunteers)

export const removeClip = ({ path }: Clip) => rm(dirname(path), { recursive: true, force: true })

/** When a sentence is said, seconds. */
export function secondsOf({ sheet }: Clip, key: string): { start: number; end: number } {
  const { startMs, endMs } = momentOf(sheet, key)
  return { start: startMs / 1000, end: endMs / 1000 }
}
