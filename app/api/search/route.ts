import { endpoint } from '@/lib/http/endpoint'
import { searchEverything } from '@/lib/search/reads'
import { searchOutput, searchQuery } from '@/lib/search/schema'

export const GET = endpoint(
  {
    summary: 'Find passages, questions, terms, explainers and episodes by words and by topic',
    query: searchQuery,
    output: searchOutput,
  },
  ({ actor, query }) => searchEverything(actor, query),
)
