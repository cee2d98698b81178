import type { Transaction } from 'sequelize'
import { QueryTypes } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { db } from '@/lib/db'
import { topicByCode } from '@/lib/topics/rules'
import { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { Question } from '@/models/question'
import { EPISODE } from './reads'
import { type WalkRoundFacts, type WalkRoundLine, walkRound } from './rules'

type ChapterRow = { start_ms: number; title: string; codes: string[] }
type TrackRow = { language: string; checked: boolean; cues: string }

const select = <T extends object>(sql: string, id: string, transaction?: Transaction) =>
  db().query<T>(sql, { bind: [id], type: QueryTypes.SELECT, transaction })

const chaptersOf = (id: string, transaction?: Transaction) =>
  select<ChapterRow>(
    `select c.start_ms, c.title, array_remove(array_agg(t.code), null) as codes
     from chapters c left join chapter_topics t on t.chapter_id = c.id
     where c.episode_id = $1 group by c.id order by c.start_ms`,
    id,
    transaction,
  )

const tracksOf = (id: string, transaction?: Transaction) =>
  select<TrackRow>(
    `select t.language, t.checked, count(c.id) as cues
     from caption_tracks t left join cues c on c.track_id = t.id
     where t.episode_id = $1 and t.kind in ('captions', 'subtitles') group by t.id`,
    id,
    transaction,
  )

const bookedWithoutAnswer = (id: string, transaction?: Transaction) =>
  Question.count({
    where: { bookedEpisodeId: id, state: 'booked', '$answer.id$': null },
    include: [{ association: 'answer', required: false, where: { episodeId: id } }],
    transaction,
  })

const hazardsOf = (chapters: ChapterRow[]): string[] => {
  const hazardous = chapters.flatMap(({ codes }) => codes.map(topicByCode)).filter((topic) => topic?.hazardous)
  return [...new Set(hazardous.map((topic) => topic?.label ?? ''))]
}

/** What the walk-round looks at. A film that is already shown counts as ready while its replacement is being made. */
export async function walkRoundFacts(episode: Episode, transaction?: Transaction): Promise<WalkRoundFacts> {
  const shown = episode.footageId ? await Footage.findByPk(episode.footageId, { transaction }) : null
  const newest = await Footage.findOne({
    where: { episodeId: episode.id },
    order: [['createdAt', 'desc']],
    transaction,
  })
  const chapters = await chaptersOf(episode.id, transaction)
  const tracks = await tracksOf(episode.id, transaction)
  return {
    footage: shown ? 'ready' : (newest?.state ?? 'none'),
    hasSound: shown?.film?.audio !== null,
    durationMs: shown?.durationMs ?? null,
    language: episode.language,
    chapters: chapters.map(({ start_ms, title, codes }) => ({ startMs: start_ms, title, topics: codes.length })),
    captions: tracks.map(({ language, checked, cues }) => ({
      language,
      checked,
      cues: Number(cues),
    })),
    hazards: hazardsOf(chapters),
    cautionsConfirmed: episode.cautionsConfirmedAt !== null,
    bookedWithoutAnswer: await bookedWithoutAnswer(episode.id, transaction),
  }
}

/** What stands between the episode and publication. For the desk. @throws Problem 404 */
export async function readWalkRound(actor: Actor, id: string): Promise<WalkRoundLine[]> {
  const row = permit(actor, 'footage.see', await Episode.findByPk(id), EPISODE)
  return walkRound(await walkRoundFacts(row))
}
