import type { CueText } from '@/lib/captions/rules'
import type { EpisodeView } from '@/lib/episodes/views'
import { isoDuration } from '@/lib/times/rules'

/**
 * The episode as schema.org/VideoObject with a Clip per chapter, for search engines that open a result at its second.
 * `base` is the installation's public address. Null for what the public cannot watch.
 */
export function videoObject(episode: EpisodeView, spoken: readonly CueText[], base: string) {
  const { film, publishedAt } = episode
  if (episode.state !== 'published' || !film || !publishedAt) return null
  const absolute = (path: string) => new URL(path, base).href
  return {
    '@context': 'https://schema.org',
    '@type': 'VideoObject',
    name: episode.title,
    description: episodeDescription(episode),
    url: absolute(episode.url),
    uploadDate: publishedAt,
    duration: episode.duration === null ? undefined : isoDuration(episode.duration),
    thumbnailUrl: film.poster ? [absolute(film.poster)] : undefined,
    contentUrl: absolute(film.plain),
    inLanguage: episode.language,
    transcript: spoken.map((cue) => cue.text).join(' ') || undefined,
    hasPart: episode.chapters.map((chapter) => ({
      '@type': 'Clip',
      name: chapter.title,
      startOffset: Math.floor(chapter.start),
      endOffset: Math.floor(chapter.end),
      url: absolute(`${episode.url}?t=${Math.floor(chapter.start)}`),
    })),
  }
}

/** What the episode is about in one or two sentences; its chapters where nobody has written any. */
export function episodeDescription({ summary, chapters, channel, number }: EpisodeView): string {
  if (summary) return summary
  const titles = chapters.map(({ title }) => title).join(', ')
  return titles ? `${titles}. Episode ${number} of ${channel.name}.` : `Episode ${number} of ${channel.name}.`
}
