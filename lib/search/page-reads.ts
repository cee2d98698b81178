import type { Actor } from '@/lib/auth/actor'
import { listChannels } from '@/lib/channels/reads'
import { Problem } from '@/lib/errors'
import { asksSomething } from './address-rules'
import { searchDatabase } from './database-reads'
import { nearestTerms, type NearTerm, searchEverything } from './reads'
import type { SearchItem, SearchQuery, SearchResult } from './schema'

/** What the search page shows. Without `result` the search is down and `items` come straight from the database. */
export type SearchPageView = {
  items: SearchItem[]
  result: SearchResult | null
  near: NearTerm[]
  channelNames: Record<string, string>
}

async function resultOf(actor: Actor, query: SearchQuery): Promise<SearchResult | null> {
  try {
    return await searchEverything(actor, query)
  } catch (failure) {
    if (failure instanceof Problem && failure.status === 503) return null
    throw failure
  }
}

/** @throws Problem 400 for a cursor that is not ours */
export async function readSearchPage(actor: Actor, query: SearchQuery): Promise<SearchPageView> {
  const [result, channels] = await Promise.all([resultOf(actor, query), listChannels()])
  const items = result?.items ?? (asksSomething(query) ? await searchDatabase(actor, query) : [])
  return {
    items,
    result,
    near: items.length === 0 ? await nearestTerms(query.q) : [],
    channelNames: Object.fromEntries(channels.map(({ slug, name }) => [slug, name])),
  }
}
