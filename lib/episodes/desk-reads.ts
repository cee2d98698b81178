import { QueryTypes } from 'sequelize'
import { z } from 'zod'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { db } from '@/lib/db'
import { notFound } from '@/lib/errors'
import { Episode } from '@/models/episode'
import { type LoadedEpisode, WITH_LINE, episodeLine } from './line'
import { EPISODE, loadEpisode } from './reads'
import type { EpisodeLine, EpisodeView, WaitingCounts } from './views'
import { wholeEpisode } from './whole'
import '@/models/associations'

export type Today = {
  drafts: EpisodeLine[]
  scheduled: EpisodeLine[]
  failed: { id: string; title: string; detail: string }[]
  counts: WaitingCounts
}

const lines = async (channelId: string, state: 'draft' | 'scheduled') =>
  (
    (await Episode.findAll({
      where: { channelId, state },
      include: WITH_LINE,
      order: [['updatedAt', 'desc']],
      limit: state === 'draft' ? 8 : undefined,
    })) as LoadedEpisode[]
  ).map(episodeLine)

async function failedFilms(channelId: string): Promise<Today['failed']> {
  return db().query(
    `select e.id, e.title, f.error_detail as detail from episodes e
     join lateral (select * from footages where episode_id = e.id order by created_at desc limit 1) f on f.state = 'failed'
     where e.channel_id = $1 and e.state <> 'withdrawn' order by f.updated_at desc limit 5`,
    { bind: [channelId], type: QueryTypes.SELECT },
  )
}

async function countQuestions(channelId: string): Promise<WaitingCounts> {
  const [row] = await db().query<Record<keyof WaitingCounts, string>>(
    `select count(*) filter (where state = 'new') as "newQuestions", count(*) filter (where state = 'queued') as queued,
       count(*) filter (where state = 'booked') as booked
     from questions where channel_id = $1 and state in ('new', 'queued', 'booked')`,
    { bind: [channelId], type: QueryTypes.SELECT },
  )
  return { newQuestions: Number(row?.newQuestions), queued: Number(row?.queued), booked: Number(row?.booked) }
}

/** What needs doing at a desk today. @throws Problem 404 outside it */
export async function readToday(actor: Actor, slug: string): Promise<Today> {
  const channel = permit(actor, 'channel.desk', await channelBySlug(slug))
  const [drafts, scheduled, failed, counts] = await Promise.all([
    lines(channel.id, 'draft'),
    lines(channel.id, 'scheduled'),
    failedFilms(channel.id),
    countQuestions(channel.id),
  ])
  return { drafts, scheduled, failed, counts }
}

/** An episode as its desk works on it. @throws Problem 404 outside the desk, or when it belongs to another channel */
export async function readDeskEpisode(actor: Actor, slug: string, id: string): Promise<EpisodeView> {
  const channel = permit(actor, 'channel.desk', await channelBySlug(slug))
  if (!z.uuid().safeParse(id).success) throw notFound(EPISODE)
  return wholeEpisode(await loadEpisode(actor, { id, channelId: channel.id }), actor)
}
