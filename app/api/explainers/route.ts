import { listExplainers } from '@/lib/handbook/reads'
import { entriesQuery, explainersOutput } from '@/lib/handbook/schema'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint(
  { summary: 'The explainers, with how far each was checked', query: entriesQuery, output: explainersOutput },
  ({ query }) => listExplainers(query),
)
