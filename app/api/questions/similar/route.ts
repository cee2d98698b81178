import { endpoint } from '@/lib/http/endpoint'
import { readAlike } from '@/lib/questions/likeness-reads'
import { likenessOutput, similarQuery } from '@/lib/questions/schema'

export const GET = endpoint(
  { summary: 'Questions and passages that look like a text', query: similarQuery, output: likenessOutput },
  ({ actor, query }) => readAlike(actor, query),
)
