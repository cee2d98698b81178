import { UniqueConstraintError } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { inTransaction } from '@/lib/db'
import { conflict, notFound, stale, unprocessable } from '@/lib/errors'
import { Episode } from '@/models/episode'
import { Planting } from '@/models/planting'
import { Season } from '@/models/season'
import { StageWindow } from '@/models/stage-window'
import { seasonOf } from './reads'
import { seasonFindings } from './rules'
import type { PlantingInput, SeasonInput } from './schema'
import { type SeasonView, seasonView } from './views'

/**
 * Begins a crop year on a channel, with no lanes yet.
 * @throws Problem 404 or 403 for those who may not, 409 when the channel has that season
 */
export async function createSeason(actor: Actor, slug: string, year: number): Promise<SeasonView> {
  const channel = await channelBySlug(slug)
  permit(actor, 'season.edit', { channelId: channel.id })
  const row = await Season.create({ channelId: channel.id, year }).catch((failure: unknown) => {
    // Two people at the desk on the same morning: the database decides, not a look beforehand.
    if (failure instanceof UniqueConstraintError) throw conflict(`The ${year} season is here already.`)
    throw failure
  })
  return seasonView(row)
}

async function seasonToEdit(actor: Actor, slug: string, year: number) {
  const channel = await channelBySlug(slug)
  const season = await Season.findOne({ where: { channelId: channel.id, year }, lock: true })
  permit(actor, 'season.edit', { channelId: channel.id })
  if (!season) throw notFound('This season')
  return season
}

async function sowLanes(seasonId: string, plantings: PlantingInput[]): Promise<void> {
  await Planting.destroy({ where: { seasonId } })
  const rows = await Planting.bulkCreate(plantings.map(({ windows: _, ...planting }) => ({ ...planting, seasonId })))
  const windows = rows.flatMap(({ id }, at) =>
    (plantings[at]?.windows ?? []).map((window) => ({ ...window, plantingId: id })),
  )
  await StageWindow.bulkCreate(windows)
}

/**
 * Saves a season as a whole: lanes and stages that are not in `input` are gone afterwards.
 * @throws Problem 404, 403, 412 with what stands now when it was saved meanwhile, 422 with one message per broken rule
 */
export async function saveSeason(actor: Actor, slug: string, year: number, input: SeasonInput, edition: number) {
  return inTransaction(async () => {
    const season = await seasonToEdit(actor, slug, year)
    const findings = seasonFindings(year, input.plantings)
    if (findings.length > 0) throw unprocessable(findings[0]?.message ?? 'A rule is broken.', findings)
    const [changed] = await Season.update({ edition: edition + 1 }, { where: { id: season.id, edition } })
    if (changed === 0) throw stale(await seasonOf(season.channelId, year))
    await sowLanes(season.id, input.plantings)
    return (await seasonOf(season.channelId, year)) as SeasonView
  })
}

/**
 * Takes a season off the board, with its lanes.
 * @throws Problem 404, 403, 409 while episodes are filed under it, 412 when it was saved meanwhile
 */
export async function deleteSeason(actor: Actor, slug: string, year: number, edition: number): Promise<void> {
  await inTransaction(async () => {
    const season = await seasonToEdit(actor, slug, year)
    const episodes = await Episode.count({ where: { seasonId: season.id } })
    if (episodes > 0) throw conflict(`${episodes} ${episodes === 1 ? 'episode is' : 'episodes are'} filed under it.`)
    const gone = await Season.destroy({ where: { id: season.id, edition } })
    if (gone === 0) throw stale(await seasonOf(season.channelId, year))
  })
}
