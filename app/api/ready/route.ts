import { Answer } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { readiness } from '@/lib/readiness'

export const GET = endpoint({ summary: 'Database, queue, storage, search and mail, each with its state' }, async () => {
  const found = await readiness()
  return new Answer(found.ready ? 200 : 503, found)
})
