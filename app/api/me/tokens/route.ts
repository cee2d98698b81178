import { created } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { readTokens } from '@/lib/people/reads'
import { tokenInput } from '@/lib/people/schema'
import { makeToken } from '@/lib/people/self-writes'

export const GET = endpoint({ summary: 'Your tokens for scripts' }, async ({ actor }) => ({
  items: await readTokens(actor),
  nextCursor: null,
}))

export const POST = endpoint(
  { summary: 'Make a token; it is told this once', input: tokenInput },
  async ({ actor, input }) => created(await makeToken(actor, input.name)),
)
