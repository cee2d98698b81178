import { type EnqueuedTaskPromise, Meilisearch, MeilisearchApiError, type Index } from 'meilisearch'
import { services } from '@/lib/services'
import type { SearchDocument } from './document-rules'
import { INDEX, indexSettings } from './index-settings'
import { quoted } from './rules'

const PATIENCE = { timeout: 60_000, interval: 50 }
const BATCH = 500

/**
 * Waits until a task is done. The 202 only says that it was accepted.
 * @throws Error with the search's own words when the task failed
 */
export async function settled(task: EnqueuedTaskPromise): Promise<void> {
  const { status, error, type, uid } = await task.waitTask(PATIENCE)
  if (status !== 'succeeded')
    throw new Error(`search task ${uid} (${type}) ${status}: ${error?.code} ${error?.message}`)
}

export const hasCode = (failure: unknown, code: string): boolean =>
  failure instanceof MeilisearchApiError && failure.cause?.code === code

const client = (): Meilisearch => services().search
const indexAt = (uid: string): Index<SearchDocument> => client().index<SearchDocument>(uid)

export const indexIsThere = (): Promise<boolean> =>
  client()
    .getRawIndex(INDEX)
    .then(() => true)
    .catch((failure: unknown) => {
      if (hasCode(failure, 'index_not_found')) return false
      throw failure
    })

async function put(uid: string, documents: SearchDocument[]): Promise<void> {
  for (let from = 0; from < documents.length; from += BATCH) {
    await settled(indexAt(uid).addDocuments(documents.slice(from, from + BATCH), { primaryKey: 'id' }))
  }
}

/** Makes the documents of a source these and no others: what is new is put in before what is old is taken out. */
export async function replaceDocuments(source: string, documents: SearchDocument[]): Promise<void> {
  await put(INDEX, documents)
  const filter = `source = ${quoted(source)}`
  const { results } = await indexAt(INDEX).getDocuments({ filter, fields: ['id'], limit: 10_000 })
  const wanted = new Set(documents.map(({ id }) => id))
  const leftOver = results.map(({ id }) => id).filter((id) => !wanted.has(id))
  if (leftOver.length > 0) await settled(indexAt(INDEX).deleteDocuments(leftOver))
}

/** Fills a fresh index beside the one in use and swaps it in: searches see the old one whole, then the new one whole. */
export async function replaceIndex(batches: AsyncIterable<SearchDocument[]>): Promise<number> {
  const fresh = `${INDEX}-fresh`
  // Left over where a rebuild was killed. The creation queues behind the deletion.
  await client().deleteIndexIfExists(fresh)
  await settled(client().createIndex(fresh, { primaryKey: 'id' }))
  await settled(indexAt(fresh).updateSettings(indexSettings))
  let count = 0
  for await (const documents of batches) {
    await put(fresh, documents)
    count += documents.length
  }
  if (!(await indexIsThere())) await settled(client().createIndex(INDEX, { primaryKey: 'id' }))
  await settled(client().swapIndexes([{ indexes: [INDEX, fresh], rename: false }]))
  await settled(client().deleteIndex(fresh))
  return count
}
