import { chapterViews, type LoadedChapter } from '@/lib/chapters/views'
import { filmBase } from '@/lib/footage/film-address'
import type { StageKey, Topic } from '@/lib/topics/rules'
import type { Channel } from '@/models/channel'
import type { Episode } from '@/models/episode'
import type { Footage } from '@/models/footage'
import type { Season } from '@/models/season'
import { type EpisodeLine, episodeUrl } from './views'

export type LoadedEpisode = Episode & {
  channel: Channel
  season: Season | null
  footage: Footage | null
  chapters: LoadedChapter[]
}

/** Chapters come in a query of their own: joined, they would multiply the rows that a limit counts. */
export const WITH_LINE = [
  'channel',
  'season',
  'footage',
  { association: 'chapters', include: ['topics'], separate: true },
]

/** What every view of an episode begins with. */
export function headOf(row: LoadedEpisode): Omit<EpisodeLine, 'stages' | 'topics' | 'poster'> {
  return {
    id: row.id,
    channel: { slug: row.channel.slug, name: row.channel.name, timeZone: row.channel.timeZone },
    number: row.number,
    slug: row.slug,
    title: row.title,
    summary: row.summary,
    season: row.season ? String(row.season.year) : null,
    filmedOn: row.filmedOn,
    state: row.state,
    publishAt: row.publishAt?.toISOString() ?? null,
    publishedAt: row.publishedAt?.toISOString() ?? null,
    duration: row.footage?.durationMs ? row.footage.durationMs / 1000 : null,
    url: episodeUrl(row.channel.slug, row.slug),
  }
}

const distinct = <T>(values: T[]): T[] => [...new Set(values)]

export function episodeLine(row: LoadedEpisode): EpisodeLine {
  const chapters = chapterViews(row.chapters, row.footage?.durationMs ?? null)
  const topics = new Map<string, Topic>(
    chapters.flatMap((chapter) => chapter.topics.map((topic) => [topic.code, topic])),
  )
  return {
    ...headOf(row),
    stages: distinct(chapters.map(({ stage }) => stage).filter((stage): stage is StageKey => stage !== null)),
    topics: [...topics.values()],
    poster: row.footage?.folder ? `${filmBase(row.footage.folder, row.state === 'published')}/poster.jpg` : null,
  }
}
