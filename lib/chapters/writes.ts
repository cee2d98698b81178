import { randomUUID } from 'node:crypto'
import type { Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { inTransaction } from '@/lib/db'
import { unprocessable } from '@/lib/errors'
import { afterEpisodeChange } from '@/lib/episodes/after-change'
import { claimEdition } from '@/lib/episodes/edition'
import { EPISODE, readEpisode } from '@/lib/episodes/reads'
import { type EpisodeView, inMs } from '@/lib/episodes/views'
import { topicByCode } from '@/lib/topics/rules'
import { Chapter } from '@/models/chapter'
import { ChapterTopic } from '@/models/chapter-topic'
import { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { brokenChapters } from './rules'
import type { ChaptersInput } from './schema'

const isHazardous = (code: string) => topicByCode(code)?.hazardous === true

async function hazardsNow(episodeId: string, transaction: Transaction): Promise<Set<string>> {
  const rows = await ChapterTopic.findAll({
    attributes: ['code'],
    where: { chapterId: (await Chapter.findAll({ where: { episodeId }, transaction })).map(({ id }) => id) },
    transaction,
  })
  return new Set(rows.map(({ code }) => code).filter(isHazardous))
}

async function replaceChapters(
  episodeId: string,
  { chapters }: ChaptersInput,
  transaction: Transaction,
): Promise<void> {
  await Chapter.destroy({ where: { episodeId }, transaction })
  const rows = chapters.map(({ start, title, topics }) => ({ id: randomUUID(), startMs: inMs(start), title, topics }))
  await Chapter.bulkCreate(
    rows.map(({ id, startMs, title }) => ({ id, episodeId, startMs, title })),
    { transaction },
  )
  await ChapterTopic.bulkCreate(
    rows.flatMap(({ id, topics }) => [...new Set(topics)].map((code) => ({ chapterId: id, code }))),
    { transaction },
  )
}

/**
 * Replaces the chapters of an episode. A hazardous job that is new asks for its cautions to be confirmed again.
 * @throws Problem 422 with what is wrong by path, 412 when somebody saved a newer edition
 */
export async function saveChapters(
  actor: Actor,
  id: string,
  input: ChaptersInput,
  edition: number,
): Promise<EpisodeView> {
  await inTransaction(async (transaction) => {
    const episode = permit(actor, 'episode.edit', await Episode.findByPk(id, { transaction }), EPISODE)
    const shown = episode.footageId ? await Footage.findByPk(episode.footageId, { transaction }) : null
    const broken = brokenChapters(input.chapters, shown?.durationMs ? shown.durationMs / 1000 : null)
    if (broken.length > 0) throw unprocessable(broken[0]?.message ?? 'Not saved.', broken)
    await claimEdition(actor, id, edition, transaction)
    const before = await hazardsNow(id, transaction)
    await replaceChapters(id, input, transaction)
    const isNew = input.chapters.some(({ topics }) => topics.some((code) => isHazardous(code) && !before.has(code)))
    if (isNew)
      await Episode.update({ cautionsConfirmedAt: null, cautionsConfirmedBy: null }, { where: { id }, transaction })
    await afterEpisodeChange(id, transaction)
  })
  return readEpisode(actor, id)
}
