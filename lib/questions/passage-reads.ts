import type { Actor } from '@/lib/auth/actor'
import { Problem } from '@/lib/errors'
import { searchEverything } from '@/lib/search/reads'
import { searchQuery } from '@/lib/search/schema'
import type { LikenessView } from './views'
import { shareOfWords } from './word-rules'

const MOST = 4

/**
 * Passages on film that may answer already; none while the search does not answer, for nobody should be kept from
 * asking by that.
 */
export async function alikePassages(actor: Actor, q: string, channel: string | undefined): Promise<LikenessView[]> {
  const query = searchQuery.parse({ q: q.slice(0, 200), kind: 'passage', limit: MOST, ...(channel ? { channel } : {}) })
  const found = await searchEverything(actor, query).catch((failure: unknown) => {
    if (failure instanceof Problem && failure.status === 503) return null
    throw failure
  })
  return (found?.items ?? []).map(({ title, snippet, url, start, end }) => ({
    kind: 'passage',
    score: shareOfWords(q, `${title} ${snippet}`),
    title,
    snippet,
    url,
    start,
    end,
  }))
}
