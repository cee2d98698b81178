import { documentRoutes } from './documents-routes'
import { indexRoutes } from './index-routes'
import { multiBody, readAs } from './requests'
import type { Route } from './route'
import { search } from './search'

/** The calls that stand in for Meilisearch's. A call that is not here is a 404, never a made-up answer. */
export const routes: Route[] = [
  { method: 'GET', path: '/health', open: true, answer: () => ({ body: { status: 'available' } }) },
  {
    method: 'GET',
    path: '/version',
    answer: () => ({ body: { commitSha: 'stand-in', commitDate: 'stand-in', pkgVersion: 'stand-in' } }),
  },
  {
    method: 'GET',
    path: '/stats',
    answer: ({ store }) => {
      const indexes = [...store.indexes].map(([uid, { documents }]) => [
        uid,
        { numberOfDocuments: documents.size, isIndexing: store.waiting.length > 0 },
      ])
      return { body: { databaseSize: 0, lastUpdate: null, indexes: Object.fromEntries(indexes) } }
    },
  },
  {
    method: 'POST',
    path: '/indexes/:uid/search',
    answer: ({ store, params: [uid = ''], body }) => ({ body: search(store.index(uid), body) }),
  },
  {
    method: 'POST',
    path: '/multi-search',
    answer: ({ store, body }) => {
      const { queries } = readAs(multiBody, body)
      const results = queries.map(({ indexUid, ...query }) => ({ indexUid, ...search(store.index(indexUid), query) }))
      return { body: { results } }
    },
  },
  ...indexRoutes,
  ...documentRoutes,
]
