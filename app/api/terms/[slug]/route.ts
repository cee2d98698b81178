import { readTerm } from '@/lib/handbook/reads'
import { slugParams, termOutput } from '@/lib/handbook/schema'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint(
  { summary: 'A term, and where it is heard in what you may see', params: slugParams, output: termOutput },
  ({ actor, params }) => readTerm(actor, params.slug),
)
