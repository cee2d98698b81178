import { Op } from 'sequelize'
import '@/models/associations'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { type Crop, stageOf, topicByCode } from '@/lib/topics/rules'
import { Chapter } from '@/models/chapter'
import type { ChapterTopic } from '@/models/chapter-topic'
import type { Channel } from '@/models/channel'
import { Episode } from '@/models/episode'
import type { Footage } from '@/models/footage'

/** What the chapter at a second of an episode is about. */
export type Subject = { chapter: string | null; crop: Crop | null; stage: string | null }

/** Crop and stage of the chapter that runs at `atMs`; nulls where nothing is filed. */
export async function subjectAt(episodeId: string, atMs: number): Promise<Subject> {
  const chapter = (await Chapter.findOne({
    where: { episodeId, startMs: { [Op.lte]: atMs } },
    order: [['startMs', 'DESC']],
    include: ['topics'],
  })) as (Chapter & { topics: ChapterTopic[] }) | null
  const codes = (chapter?.topics ?? []).map(({ code }) => code).sort()
  const stage = codes.find((code) => stageOf([code]) !== null) ?? null
  return { chapter: chapter?.title ?? null, stage, crop: (stage && topicByCode(stage)?.crop) || null }
}

/** The place of an episode that somebody asks about. */
export type AskPlace = Subject & {
  episode: { id: string; channelId: string; number: number; title: string; slug: string }
  channel: { slug: string; name: string }
  /** seconds */
  at: number | null
  durationMs: number | null
}

/** @throws Problem 404 when the episode is not visible to this actor */
export async function readAskPlace(actor: Actor, episodeId: string, at: number | null): Promise<AskPlace> {
  const found = (await Episode.findByPk(episodeId, { include: ['channel', 'footage'] })) as
    (Episode & { channel: Channel; footage: Footage | null }) | null
  const { id, channelId, number, title, slug, channel, footage } = permit(actor, 'episode.see', found, 'This episode')
  const subject = at === null ? { chapter: null, crop: null, stage: null } : await subjectAt(id, at * 1000)
  return {
    ...subject,
    episode: { id, channelId, number, title, slug },
    channel: { slug: channel.slug, name: channel.name },
    at,
    durationMs: footage?.durationMs ?? null,
  }
}
