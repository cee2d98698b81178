import { type EpisodeView, inMs } from '@/lib/episodes/views'
import { writeChaptersVtt } from '@/media/webvtt'

/** Chapters as a WebVTT chapters file (W3C WebVTT, 1.4 Chapters). */
export const chaptersVtt = ({ chapters }: EpisodeView): string =>
  writeChaptersVtt(chapters.map(({ start, end, title }) => ({ startMs: inMs(start), endMs: inMs(end), title })))

/** Chapters as JSON chapters 1.2 of the Podcasting 2.0 namespace. */
export const chaptersJson = ({ title, chapters }: EpisodeView) => ({
  version: '1.2.0',
  title,
  chapters: chapters.map(({ start, end, title: chapter }) => ({ startTime: start, endTime: end, title: chapter })),
})
