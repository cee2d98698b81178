import { SearchError } from './errors'
import { filterTest } from './filter-match'
import { documentsBody, fetchBody, filterBody, idsBody, readAs } from './requests'
import { accepted, type Route } from './route'
import type { Doc, Json } from './shapes'
import { readFilter } from './filter'
import type { Store } from './store'

const picked = (document: Doc, fields: string[] | null | undefined): Doc =>
  !fields || fields.includes('*')
    ? document
    : Object.fromEntries(Object.entries(document).filter(([name]) => fields.includes(name)))

function list(store: Store, uid: string, wish: unknown): Json {
  const { offset, limit, filter, fields, ids } = readAs(fetchBody, wish)
  const index = store.index(uid)
  const passes = filterTest(index, filter)
  const wanted = ids && new Set(ids.map(String))
  const found = [...index.documents].filter(([key, each]) => (!wanted || wanted.has(key)) && passes(each))
  const results = found.slice(offset, offset + limit).map(([, each]) => picked(each, fields))
  return { results, offset, limit, total: found.length }
}

const listFields = (query: URLSearchParams) => ({
  fields: query.get('fields')?.split(','),
  ids: query.get('ids')?.split(','),
})

function add(merge: boolean): Route['answer'] {
  return ({ tasks, params: [indexUid = ''], body, query }) => {
    const documents = readAs(documentsBody, body, 'malformed_payload')
    const primaryKey = query.get('primaryKey')
    return accepted(tasks.accept({ type: 'documentAdditionOrUpdate', indexUid, documents, merge, primaryKey }))
  }
}

/** Documents of an index: put in, put over, read, taken out. */
export const documentRoutes: Route[] = [
  { method: 'POST', path: '/indexes/:uid/documents', answer: add(false) },
  { method: 'PUT', path: '/indexes/:uid/documents', answer: add(true) },
  {
    method: 'GET',
    path: '/indexes/:uid/documents',
    answer: ({ store, params: [uid = ''], query }) => ({
      body: list(store, uid, { ...Object.fromEntries(query), ...listFields(query) }),
    }),
  },
  {
    method: 'POST',
    path: '/indexes/:uid/documents/fetch',
    answer: ({ store, params: [uid = ''], body }) => ({ body: list(store, uid, body) }),
  },
  {
    method: 'GET',
    path: '/indexes/:uid/documents/:id',
    answer: ({ store, params: [uid = '', id = ''], query }) => {
      const document = store.index(uid).documents.get(id)
      if (!document) throw new SearchError(404, 'document_not_found', `Document \`${id}\` not found.`)
      return { body: picked(document, listFields(query).fields) }
    },
  },
  {
    method: 'DELETE',
    path: '/indexes/:uid/documents/:id',
    answer: ({ tasks, params: [indexUid = '', id = ''] }) =>
      accepted(tasks.accept({ type: 'documentDeletion', indexUid, ids: [id] })),
  },
  {
    method: 'DELETE',
    path: '/indexes/:uid/documents',
    answer: ({ tasks, params: [indexUid = ''] }) => accepted(tasks.accept({ type: 'documentDeletion', indexUid })),
  },
  {
    method: 'POST',
    path: '/indexes/:uid/documents/delete-batch',
    answer: ({ tasks, params: [indexUid = ''], body }) =>
      accepted(tasks.accept({ type: 'documentDeletion', indexUid, ids: readAs(idsBody, body) })),
  },
  {
    method: 'POST',
    path: '/indexes/:uid/documents/delete',
    answer: ({ tasks, params: [indexUid = ''], body }) => {
      const { filter } = readAs(filterBody, body, 'missing_document_filter')
      if (typeof filter === 'string') readFilter(filter)
      return accepted(tasks.accept({ type: 'documentDeletion', indexUid, filter }))
    },
  },
]
