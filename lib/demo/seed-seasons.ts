import type { Transaction } from 'sequelize'
import { Planting } from '@/models/planting'
import { Season } from '@/models/season'
import { StageWindow } from '@/models/stage-window'
import { idOf, type Ids } from './seed-people'
import { plantings } from './story/seasons'
import type { StageKey } from '@/lib/topics/rules'

export const seasonKey = (channel: string, year: string) => `${channel} ${year}`

/** Seasons with their lanes. Returns their ids by channel and year. */
export async function seedSeasons(channelIds: Ids, transaction: Transaction): Promise<Ids> {
  const ids: Ids = new Map()
  for (const { channel, season, crop, field, acres, plantedOn, periods } of plantings) {
    const key = seasonKey(channel, season)
    if (!ids.has(key)) {
      const made = { channelId: idOf(channelIds, channel), year: Number(season) }
      ids.set(key, (await Season.create(made, { transaction })).id)
    }
    const lane = { seasonId: idOf(ids, key), crop, field, areaAcres: acres, plantedOn }
    const planting = await Planting.create(lane, { transaction })
    const windows = periods.map(({ stage, from, to }) => ({
      plantingId: planting.id,
      stage: stage as StageKey,
      startsOn: from,
      endsOn: to,
    }))
    await StageWindow.bulkCreate(windows, { transaction })
  }
  return ids
}
