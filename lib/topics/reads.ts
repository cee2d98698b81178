import { cutPage, decodeCursor, type Page } from '@/lib/http/paging'
import { type Topic, topics } from './rules'
import type { TopicsQuery } from './schema'

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
