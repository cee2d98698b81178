import { badRequest, SearchError } from './errors'
import { filterTest } from './filter-match'
import { forgetDocument, rememberDocument } from './lexicon'
import type { Doc, Index, Json, Work } from './shapes'
import { keyOf, type Store } from './store'

/** What a task did, for its `details`; the indexes it changed are written before it counts as done. */
type Outcome = { details: Record<string, Json>; changed: Index[] }

function primaryKeyFor(index: Index, wanted: string | null, documents: Doc[]): string {
  if (index.primaryKey && wanted && index.primaryKey !== wanted) {
    throw badRequest(`Index already has a primary key: \`${index.primaryKey}\`.`, 'index_primary_key_already_exists')
  }
  const known = index.primaryKey ?? wanted
  if (known) return known
  // Documented: without one, the only field whose name ends in "id" becomes the key.
  const named = Object.keys(documents[0] ?? {}).filter((name) => name.toLowerCase().endsWith('id'))
  if (named.length === 1 && named[0]) return named[0]
  const code = named.length === 0 ? 'no_candidate_found' : 'multiple_candidates_found'
  throw badRequest('The primary key cannot be told from the documents.', `index_primary_key_${code}`)
}

function checkId(document: Doc, primaryKey: string) {
  const id = document[primaryKey]
  if (id === undefined) {
    throw badRequest(`Document has no \`${primaryKey}\`: ${JSON.stringify(document)}.`, 'missing_document_id')
  }
  const fits =
    (typeof id === 'string' && /^[\w-]{1,511}$/.test(id)) || (typeof id === 'number' && Number.isSafeInteger(id))
  if (!fits) {
    const text = 'is invalid. It is a whole number or up to 511 of a-z A-Z 0-9 - and _.'
    throw badRequest(`Document identifier ${JSON.stringify(id)} ${text}`, 'invalid_document_id')
  }
}

function addDocuments(store: Store, work: Extract<Work, { type: 'documentAdditionOrUpdate' }>): Outcome {
  const { documents, merge } = work
  const index = store.indexes.get(work.indexUid) ?? store.newIndex(work.indexUid, work.primaryKey)
  const primaryKey = primaryKeyFor(index, work.primaryKey, documents)
  // All are checked before one is taken: a task is done whole or not at all.
  for (const document of documents) checkId(document, primaryKey)
  index.primaryKey = primaryKey
  for (const document of documents) {
    const key = keyOf(document, primaryKey)
    const whole = merge ? { ...index.documents.get(key), ...document } : document
    index.documents.set(key, whole)
    if (index.lexicon) rememberDocument(index.lexicon, index, key, whole)
  }
  return { details: { indexedDocuments: documents.length }, changed: [index] }
}

function deleteDocuments(store: Store, work: Extract<Work, { type: 'documentDeletion' }>): Outcome {
  const index = store.index(work.indexUid)
  const before = index.documents.size
  const passes = filterTest(index, work.filter)
  const keys = work.ids ?? [...index.documents].filter(([, document]) => passes(document)).map(([key]) => key)
  for (const key of keys) {
    index.documents.delete(key)
    if (index.lexicon) forgetDocument(index.lexicon, key)
  }
  return { details: { deletedDocuments: before - index.documents.size }, changed: [index] }
}

function swap(store: Store, pairs: [string, string][]): Outcome {
  const missing = pairs.flat().filter((uid) => !store.indexes.has(uid))
  if (missing.length > 0) throw new SearchError(404, 'index_not_found', `Indexes not found: ${missing.join(', ')}.`)
  for (const [left, right] of pairs) {
    const [first, second] = [store.index(left), store.index(right)]
    store.indexes.set(left, { ...second, uid: left })
    store.indexes.set(right, { ...first, uid: right })
  }
  return { details: {}, changed: [] }
}

function createIndex(store: Store, uid: string, primaryKey: string | null): Outcome {
  if (store.indexes.has(uid)) throw new SearchError(409, 'index_already_exists', `Index \`${uid}\` already exists.`)
  return { details: { primaryKey }, changed: [store.newIndex(uid, primaryKey)] }
}

function updateIndex(store: Store, uid: string, primaryKey: string | null): Outcome {
  const index = store.index(uid)
  if (index.documents.size > 0 && index.primaryKey !== primaryKey) {
    throw badRequest(`Index already has a primary key: \`${index.primaryKey}\`.`, 'index_primary_key_already_exists')
  }
  index.primaryKey = primaryKey
  return { details: { primaryKey }, changed: [index] }
}

function deleteIndex(store: Store, uid: string): Outcome {
  const deletedDocuments = store.index(uid).documents.size
  store.indexes.delete(uid)
  return { details: { deletedDocuments }, changed: [] }
}

function changeSettings(store: Store, work: Extract<Work, { type: 'settingsUpdate' }>): Outcome {
  const index = store.indexes.get(work.indexUid) ?? store.newIndex(work.indexUid, null)
  index.settings = { ...index.settings, ...work.settings }
  index.lexicon = null
  return { details: work.settings, changed: [index] }
}

/** Does what a task asks for, in memory. Throws what the task is to report; running it a second time does no harm. */
export function apply(store: Store, work: Work): Outcome {
  switch (work.type) {
    case 'documentAdditionOrUpdate':
      return addDocuments(store, work)
    case 'documentDeletion':
      return deleteDocuments(store, work)
    case 'indexSwap':
      return swap(store, work.swaps)
    case 'indexCreation':
      return createIndex(store, work.indexUid, work.primaryKey)
    case 'indexUpdate':
      return updateIndex(store, work.indexUid, work.primaryKey)
    case 'indexDeletion':
      return deleteIndex(store, work.indexUid)
    case 'settingsUpdate':
      return changeSettings(store, work)
  }
}
