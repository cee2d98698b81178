import { QueryTypes } from 'sequelize'
import { db } from '@/lib/db'
import { crops, type Crop } from './crops'
import { topicByCode } from './rules'
import { stageKeys, type StageKey } from './stage-words'

export type FiledStages = { crop: Crop; stages: StageKey[] }

/** Crops and their principal stages that published chapters are filed under, in the order of the pickers. */
export async function filedStages(): Promise<FiledStages[]> {
  const rows = await db().query<{ code: string }>(
    `select distinct t.code from chapter_topics t
     join chapters c on c.id = t.chapter_id join episodes e on e.id = c.episode_id
     where e.state = 'published'`,
    { type: QueryTypes.SELECT },
  )
  const filed = rows.flatMap(({ code }) => topicByCode(code) ?? [])
  return crops.flatMap((crop) => {
    const own = new Set(filed.filter((topic) => topic.crop === crop).map(({ stage }) => stage))
    const stages = stageKeys.filter((stage) => own.has(stage))
    return stages.length === 0 ? [] : [{ crop, stages }]
  })
}
