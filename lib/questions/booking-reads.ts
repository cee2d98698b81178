import { QueryTypes } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { db } from '@/lib/db'
import { Episode } from '@/models/episode'
import { EPISODE } from '@/lib/episodes/reads'
import { viewsOf } from './reads'
import { type ComingEpisode, type DeskQuestionView, deskQuestionView } from './views'

/** Episodes of a channel that questions can be booked for, the next one first. @throws Problem 404, 401 */
export async function readComingEpisodes(actor: Actor, slug: string): Promise<ComingEpisode[]> {
  const channel = permit(actor, 'channel.desk', await channelBySlug(slug))
  const rows = await Episode.findAll({
    where: { channelId: channel.id, state: ['draft', 'scheduled'] },
    attributes: ['id', 'number', 'title'],
    order: [['number', 'ASC']],
  })
  return rows.map(({ id, number, title }) => ({ id, number, title }))
}

/** What an episode is to answer, or answers: in the order of the answers, then of the booking. @throws Problem 404 */
export async function readQuestionsOf(actor: Actor, episodeId: string): Promise<DeskQuestionView[]> {
  const episode = permit(actor, 'footage.see', await Episode.findByPk(episodeId), EPISODE)
  const rows = await db().query<{ id: string }>(
    `select q.id from questions q left join answers a on a.question_id = q.id and a.episode_id = $1
     where (q.state = 'booked' and q.booked_episode_id = $1) or (q.state = 'answered' and a.episode_id = $1)
     order by a.start_ms nulls last, q.updated_at, q.id`,
    { bind: [episode.id], type: QueryTypes.SELECT },
  )
  return viewsOf(
    rows.map(({ id }) => id),
    actor,
    deskQuestionView,
  )
}
