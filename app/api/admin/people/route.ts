import { endpoint } from '@/lib/http/endpoint'
import { listPeople } from '@/lib/site/reads'
import { peopleQuery } from '@/lib/site/schema'

export const GET = endpoint({ summary: 'Everybody, for the site admin', query: peopleQuery }, ({ actor, query }) =>
  listPeople(actor, query),
)
