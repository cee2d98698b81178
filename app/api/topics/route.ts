import { endpoint } from '@/lib/http/endpoint'
import { listTopics } from '@/lib/topics/reads'
import { topicsOutput, topicsQuery } from '@/lib/topics/schema'

export const GET = endpoint(
  {
    summary: 'What chapters are filed under: crop stages, field jobs, subjects',
    query: topicsQuery,
    output: topicsOutput,
  },
  ({ query }) => listTopics(query),
)
