import { listTerms } from '@/lib/handbook/reads'
import { entriesQuery, termsOutput } from '@/lib/handbook/schema'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint(
  { summary: 'The glossary from A to Z', query: entriesQuery, output: termsOutput },
  ({ query }) => listTerms(query),
)
