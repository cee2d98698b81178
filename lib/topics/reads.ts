import { QueryTypes } from 'sequelize'
import { db } from '@/lib/db'
import { cutPage, decodeCursor, type Page } from '@/lib/http/paging'
import { crops, type Crop } from './crops'
import { type Topic, topicByCode, topics } from './rules'
import type { TopicsQuery } from './schema'
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

/** The vocabulary, or the part of it for one crop or of one kind. */
export function listTopics({ crop, kind, cursor, limit = topics.length }: TopicsQuery): Page<Topic> {
  const wanted = topics.filter((topic) => (!crop || topic.crop === crop) && (!kind || topic.kind === kind))
  const last = cursor && decodeCursor(cursor, 1)[0]
  const from = last ? wanted.findIndex(({ code }) => code === last) + 1 : 0
  return cutPage(
    wanted.slice(from, from + limit + 1),
    limit,
    (topic) => topic,
    ({ code }) => [code],
  )
}
