import { Op, literal, type WhereOptions } from 'sequelize'
import { db } from '@/lib/db'
import { type Topic, topics } from '@/lib/topics/rules'

export type TopicFilter = { crop?: string; stage?: string; job?: string; subject?: string }

const codesWhere = (fits: (topic: Topic) => boolean) => topics.filter(fits).map(({ code }) => code)

/** `wheat-21`, `wheat-2` (with all below it), `soil`; or, together with a crop, the bare digits. */
function stageCodes(stage: string, crop?: string): string[] {
  const wanted = crop && /^\d{1,2}$/.test(stage) ? `${crop}-${stage}` : stage
  return codesWhere(
    ({ code, kind }) => kind === 'stage' && (code === wanted || (/-\d$/.test(wanted) && code.startsWith(wanted))),
  )
}

const prefixed = (prefix: string, value: string) => (value.startsWith(prefix) ? value : prefix + value)

/** The lists of codes that an episode must have one of each of. */
export function wantedCodes({ crop, stage, job, subject }: TopicFilter): string[][] {
  return [
    ...(crop && !stage ? [codesWhere((topic) => topic.crop === crop)] : []),
    ...(stage ? [stageCodes(stage, crop)] : []),
    ...(job ? [[prefixed('job-', job)]] : []),
    ...(subject ? [[prefixed('subject-', subject)]] : []),
  ]
}

/** An episode of which one chapter is filed under one of the codes. */
const filedUnder = (codes: string[]) =>
  literal(
    `exists (select 1 from chapters c join chapter_topics t on t.chapter_id = c.id
      where c.episode_id = "Episode"."id" and t.code in (${codes.map((code) => db().escape(code)).join(', ') || 'null'}))`,
  )

export const topicWhere = (filter: TopicFilter): WhereOptions => ({ [Op.and]: wantedCodes(filter).map(filedUnder) })
