import '@/models/associations'
import { chapterViews } from '@/lib/chapters/views'
import { type LoadedEpisode, WITH_LINE } from '@/lib/episodes/line'
import { weaveClaims } from '@/lib/handbook/rules'
import { Answer } from '@/models/answer'
import { CaptionTrack } from '@/models/caption-track'
import type { Channel } from '@/models/channel'
import type { Claim } from '@/models/claim'
import { Cue } from '@/models/cue'
import { Episode } from '@/models/episode'
import { Explainer } from '@/models/explainer'
import { Question } from '@/models/question'
import type { Season } from '@/models/season'
import { Term } from '@/models/term'
import {
  episodeDocuments,
  type EpisodeFacts,
  explainerDocument,
  questionDocument,
  type SearchDocument,
  termDocument,
} from './document-rules'

/** States of a question that everybody may read; one that was joined is found by the question it was joined to. */
export const publicQuestionStates = ['new', 'queued', 'booked', 'answered']

/** The captions in the language that is spoken; where there are none, the first there are. */
async function spokenTracks(episodes: readonly Episode[]): Promise<Map<string, string>> {
  const languages = new Map(episodes.map(({ id, language }) => [id, language]))
  const tracks = await CaptionTrack.findAll({
    where: { episodeId: [...languages.keys()], kind: ['captions', 'subtitles'] },
    order: [['language', 'desc']],
  })
  const spoken = (track: CaptionTrack) => (track.language === languages.get(track.episodeId) ? 1 : 0)
  const lastWins = [...tracks].sort((left, right) => spoken(left) - spoken(right))
  return new Map(lastWins.map(({ episodeId, id }) => [episodeId, id]))
}

async function cuesByTrack(trackIds: string[]): Promise<Map<string, EpisodeFacts['cues']>> {
  const rows = await Cue.findAll({
    where: { trackId: trackIds },
    order: [
      ['startMs', 'asc'],
      ['endMs', 'asc'],
    ],
  })
  const found = new Map<string, EpisodeFacts['cues']>()
  for (const { trackId, startMs, endMs, plain, speaker } of rows) {
    const cue = { start: startMs / 1000, end: endMs / 1000, text: plain, speaker, terms: [] }
    found.set(trackId, [...(found.get(trackId) ?? []), cue])
  }
  return found
}

function chapterFacts(row: LoadedEpisode): EpisodeFacts['chapters'] {
  const ordered = [...row.chapters].sort((a, b) => a.startMs - b.startMs)
  const views = chapterViews(ordered, row.footage?.durationMs ?? null)
  return ordered.map(({ id, title, startMs, topics }, n) => ({
    id,
    title,
    start: startMs / 1000,
    end: views[n]?.end ?? startMs / 1000,
    codes: topics.map(({ code }) => code),
  }))
}

/** Documents of those of these episodes that are published. A fixed number of queries, however many there are. */
export async function documentsOfEpisodes(ids: readonly string[]): Promise<SearchDocument[]> {
  const where = { id: [...ids], state: 'published' as const }
  const rows = (await Episode.findAll({ where, include: WITH_LINE })) as LoadedEpisode[]
  const tracks = await spokenTracks(rows)
  const cues = await cuesByTrack([...tracks.values()])
  return rows.flatMap((row) =>
    episodeDocuments({
      id: row.id,
      title: row.title,
      summary: row.summary,
      number: row.number,
      channel: row.channel,
      season: row.season ? String(row.season.year) : null,
      publishedAt: row.publishedAt,
      chapters: chapterFacts(row),
      cues: cues.get(tracks.get(row.id) ?? '') ?? [],
    }),
  )
}

type LoadedQuestion = Question & {
  channel: Channel
  episode: (Episode & { season: Season | null }) | null
  answer: (Answer & { episode: Episode }) | null
}

/** Documents of those of these questions that everybody may read. */
export async function documentsOfQuestions(ids: readonly string[]): Promise<SearchDocument[]> {
  const rows = (await Question.findAll({
    where: { id: [...ids], state: publicQuestionStates },
    include: [
      'channel',
      { association: 'episode', include: ['season'] },
      { association: 'answer', include: ['episode'] },
    ],
  })) as LoadedQuestion[]
  return rows.map(({ id, title, body, crop, stage, state, createdAt, channel, episode, answer }) =>
    questionDocument({
      id,
      title,
      body,
      crop,
      stage,
      askedAt: createdAt,
      channel: channel.slug,
      season: episode?.state === 'published' && episode.season ? String(episode.season.year) : null,
      answer: state === 'answered' && answer?.episode.state === 'published' ? answer.text : null,
    }),
  )
}

export async function documentsOfTerms(ids: readonly string[]): Promise<SearchDocument[]> {
  const rows = await Term.findAll({ where: { id: [...ids] } })
  return rows.map(({ id, label, definition, synonyms, inflections, regional, spanish, context }) => {
    const names = [...synonyms, ...inflections, ...regional.map(({ name }) => name), ...(spanish ? [spanish] : [])]
    return termDocument({ id, label, definition, names, crops: context?.crops ?? [] })
  })
}

type LoadedExplainer = Explainer & { claims: Claim[] }

/** Documents of these explainers, the figures of their claims standing in the text as they are read. */
export async function documentsOfExplainers(ids: readonly string[]): Promise<SearchDocument[]> {
  const rows = (await Explainer.findAll({ where: { id: [...ids] }, include: ['claims'] })) as LoadedExplainer[]
  return rows.map(({ id, title, summary, body, claims }) =>
    explainerDocument({ id, title, summary, body: weaveClaims(body, claims) }),
  )
}
