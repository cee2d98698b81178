import { QueryTypes } from 'sequelize'
import { now } from '@/lib/clock'
import { todayIn } from '@/lib/dates/rules'
import { db } from '@/lib/db'
import type { Crop } from '@/lib/topics/crops'
import { type SeasonWindow, type Useful, usefulUntil } from './urgency-rules'
import { stageKeyOf } from './views'

/** Of older seasons only the dates' place in the year is of use, and two of them tell that. */
const SEASONS_BACK = 2

type Row = { channel_id: string; crop: Crop; stage: SeasonWindow['stage']; starts_on: string; ends_on: string }
type Asked = { channel_id: string; time_zone: string; crop: Crop | null; stage: string | null }

/** Says of any question of these channels how long its answer is of use. One query for all of them. */
export async function usefulOn(channelIds: readonly string[]): Promise<(asked: Asked) => Useful> {
  const at = now()
  const rows = await db().query<Row>(
    `select s.channel_id, p.crop, w.stage, w.starts_on::text, w.ends_on::text
     from stage_windows w join plantings p on p.id = w.planting_id join seasons s on s.id = p.season_id
     where s.channel_id = any($1::uuid[]) and s.year >= $2`,
    { bind: [[...new Set(channelIds)], at.getUTCFullYear() - SEASONS_BACK], type: QueryTypes.SELECT },
  )
  const windowsOf = new Map<string, SeasonWindow[]>()
  for (const { channel_id, crop, stage, starts_on, ends_on } of rows)
    windowsOf.set(channel_id, [
      ...(windowsOf.get(channel_id) ?? []),
      { crop, stage, startsOn: starts_on, endsOn: ends_on },
    ])
  return ({ channel_id, time_zone, crop, stage }) =>
    usefulUntil({ crop, stage: stageKeyOf(stage) }, windowsOf.get(channel_id) ?? [], todayIn(time_zone, at))
}
