import { Op, type WhereOptions } from 'sequelize'
import '@/models/associations'
import { type Actor, deskChannelIds, isAtDesk } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { notFound } from '@/lib/errors'
import { cutPage, decodeCursor, type Page } from '@/lib/http/paging'
import { Episode } from '@/models/episode'
import { topicWhere } from './filters'
import { episodeLine, type LoadedEpisode, WITH_LINE } from './line'
import type { EpisodesQuery } from './schema'
import type { EpisodeLine, EpisodeView } from './views'
import { wholeEpisode } from './whole'

export const EPISODE = 'This episode'

/** Rows that this actor may see: what is published, and everything of their own desks. */
export const visibleTo = (actor: Actor): WhereOptions => ({
  [Op.or]: [{ state: 'published' }, { channelId: deskChannelIds(actor) }],
})

/** The loaded row of a visible episode. @throws Problem 404 */
export async function loadEpisode(actor: Actor, where: WhereOptions): Promise<LoadedEpisode> {
  const row = (await Episode.findOne({
    where: { [Op.and]: [where, visibleTo(actor)] },
    include: WITH_LINE,
  })) as LoadedEpisode | null
  return permit(actor, 'episode.see', row, EPISODE)
}

/** @throws Problem 404 when it is not there or not visible to this actor */
export const readEpisode = async (actor: Actor, id: string): Promise<EpisodeView> =>
  wholeEpisode(await loadEpisode(actor, { id }), actor)

/** @throws Problem 404 */
export async function readEpisodeBySlug(actor: Actor, channel: string, slug: string): Promise<EpisodeView> {
  const { id: channelId } = await channelBySlug(channel)
  return wholeEpisode(await loadEpisode(actor, { channelId, slug }), actor)
}

const stateWhere = (actor: Actor, channelId: string, state: EpisodesQuery['state']): WhereOptions => {
  if (!isAtDesk(actor, channelId)) {
    if (state && state !== 'published') throw notFound('This list')
    return { state: 'published' }
  }
  return state ? { state } : {}
}

/** Episodes of a channel, newest first. States but `published` only for its desk. */
export async function listEpisodes(actor: Actor, channel: string, query: EpisodesQuery): Promise<Page<EpisodeLine>> {
  const { id: channelId } = await channelBySlug(channel)
  const before = query.cursor ? Number(decodeCursor(query.cursor, 1)[0]) : null
  const rows = (await Episode.findAll({
    where: {
      [Op.and]: [
        { channelId },
        stateWhere(actor, channelId, query.state),
        before === null ? {} : { number: { [Op.lt]: before } },
        query.season ? { '$season.year$': Number(query.season) } : {},
        topicWhere(query),
      ],
    },
    include: WITH_LINE,
    order: [['number', 'desc']],
    limit: query.limit + 1,
  })) as LoadedEpisode[]
  return cutPage(rows, query.limit, episodeLine, ({ number }) => [number])
}

/** The newest published episodes of all channels, for the front page. */
export async function newestEpisodes(most: number): Promise<EpisodeLine[]> {
  const rows = (await Episode.findAll({
    where: { state: 'published' },
    include: WITH_LINE,
    order: [['publishedAt', 'desc']],
    limit: most,
  })) as LoadedEpisode[]
  return rows.map(episodeLine)
}
