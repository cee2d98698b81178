import { Op } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { may } from '@/lib/auth/policy'
import { channelBySlug, readDeskChannel } from '@/lib/channels/reads'
import { channelView, type ChannelView } from '@/lib/channels/views'
import { now } from '@/lib/clock'
import { daysApartInYear, todayIn, yearOf, type Day } from '@/lib/dates/rules'
import { notFound } from '@/lib/errors'
import '@/models/associations'
import type { Channel } from '@/models/channel'
import { Episode } from '@/models/episode'
import { Season } from '@/models/season'
import { boardSpan, seasonToShow } from './rules'
import {
  type Board,
  type DeskSeason,
  type FilmedEpisode,
  type FilmedRow,
  filmedEpisode,
  type SeasonRow,
  type SeasonView,
  seasonView,
} from './views'

const lanes = { association: 'plantings', include: [{ association: 'windows' }] }

/** Crop years of a channel, newest first. */
export async function seasonYears(channelId: string): Promise<number[]> {
  const rows = await Season.findAll({ where: { channelId }, attributes: ['year'], order: [['year', 'desc']] })
  return rows.map(({ year }) => year)
}

/** The same for one slug, as the API lists things. A farm has tens of seasons at most: one page. @throws Problem 404 */
export async function readChannelSeasons(slug: string) {
  const years = await seasonYears((await channelBySlug(slug)).id)
  return { items: years.map((year) => ({ year })), nextCursor: null }
}

/** A season with its lanes; null when the channel has none of that year. Seasons are public. */
export async function seasonOf(channelId: string, year: number): Promise<SeasonView | null> {
  const row = await Season.findOne({ where: { channelId, year }, include: [lanes] })
  return row && seasonView(row as SeasonRow)
}

/** @throws Problem 404 */
export async function readSeason(slug: string, year: number): Promise<SeasonView> {
  const season = await seasonOf((await channelBySlug(slug)).id, year)
  if (!season) throw notFound('This season')
  return season
}

/**
 * The front page of a channel: the season asked for, or the one nearest to today, with what was filmed in it.
 * @throws Problem 404 when there is no such channel, or no season of the year asked for
 */
export async function readBoard(slug: string, year: number | null): Promise<Board> {
  const row = await channelBySlug(slug)
  const [today, years] = [todayIn(row.timeZone, now()), await seasonYears(row.id)]
  const shown = year ?? seasonToShow(years, today)
  const season = shown === null ? null : await seasonOf(row.id, shown)
  if (year !== null && !season) throw notFound('This season')
  const episodes = season ? await filmedEpisodes(row, boardSpan(season.year, season.plantings)) : []
  return { channel: channelView(row), today, years, season, episodes }
}

/** Published episodes of a channel that were filmed in these days, in the order of filming. */
async function filmedEpisodes(channel: Channel, { from, to }: { from: Day; to: Day }): Promise<FilmedEpisode[]> {
  const rows = await Episode.findAll({
    where: { channelId: channel.id, state: 'published', filmedOn: { [Op.between]: [from, to] } },
    attributes: ['id', 'number', 'title', 'slug', 'filmedOn'],
    include: [{ association: 'chapters', attributes: ['id'], include: [{ association: 'topics' }] }],
    order: [
      ['filmedOn', 'asc'],
      ['number', 'asc'],
    ],
  })
  return rows.map((row) => filmedEpisode(row as FilmedRow, channel.slug))
}

/** How far from today's day of the year still counts as this week in another year. */
const WEEK_REACH_DAYS = 10

/** Published episodes filmed about this week in other years, the latest year first. */
export async function thisWeekInOtherYears(channel: ChannelView, today: Day): Promise<FilmedEpisode[]> {
  const rows = await Episode.findAll({
    where: { channelId: channel.id, state: 'published', filmedOn: { [Op.ne]: null } },
    attributes: ['id', 'number', 'title', 'slug', 'filmedOn'],
    order: [['filmedOn', 'desc']],
  })
  return rows
    .map((row) => filmedEpisode(row, channel.slug))
    .filter(({ filmedOn }) => yearOf(filmedOn) !== yearOf(today) && daysApartInYear(today, filmedOn) <= WEEK_REACH_DAYS)
    .slice(0, 4)
}

/** The seasons nearest to today of several channels, for their strips on the front page. */
export async function currentSeasons(channels: ChannelView[]): Promise<Map<string, SeasonView>> {
  const rows = await Season.findAll({
    where: { channelId: { [Op.in]: channels.map(({ id }) => id) } },
    include: [lanes],
  })
  const seasons = channels.flatMap(({ id, timeZone }) => {
    const own = rows.filter(({ channelId }) => channelId === id)
    const year = seasonToShow(
      own.map((row) => row.year),
      todayIn(timeZone, now()),
    )
    const row = own.find((one) => one.year === year)
    return row ? [[id, seasonView(row as SeasonRow)] as const] : []
  })
  return new Map(seasons)
}

/** The season as the desk edits it; advisers read it. @throws Problem 404 for people of other channels, 401 for nobody */
export async function readDeskSeason(actor: Actor, slug: string, year: number | null): Promise<DeskSeason> {
  const channel = await readDeskChannel(actor, slug)
  const [today, years] = [todayIn(channel.timeZone, now()), await seasonYears(channel.id)]
  const shown = year ?? seasonToShow(years, today)
  const season = shown === null ? null : await seasonOf(channel.id, shown)
  if (year !== null && !season) throw notFound('This season')
  return { channel, today, years, season, mayEdit: may(actor, 'season.edit', { channelId: channel.id }) }
}
