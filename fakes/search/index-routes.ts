import { badRequest } from './errors'
import { indexBody, indexChange, listQuery, readAs, swapsBody } from './requests'
import { accepted, type Route } from './route'
import { defaultSettings, settingNamed, settingsChange, type SettingName } from './settings'
import type { Index, Json, Task } from './shapes'
import { taskAt, tasksPage } from './tasks-read'

const indexView = ({ uid, primaryKey, createdAt, updatedAt }: Index) => ({ uid, primaryKey, createdAt, updatedAt })

function setting(slug: string): SettingName {
  const name = settingNamed(slug)
  if (!name) throw badRequest(`There is no setting \`${slug}\` here.`, 'not_found')
  return name
}

function statsOf(index: Index): { [key: string]: Json } {
  const fields: Record<string, number> = {}
  for (const document of index.documents.values()) {
    for (const name of Object.keys(document)) fields[name] = (fields[name] ?? 0) + 1
  }
  return { numberOfDocuments: index.documents.size, isIndexing: false, fieldDistribution: fields }
}

const indexes: Route[] = [
  {
    method: 'GET',
    path: '/indexes',
    answer: ({ store, query }) => {
      const { offset, limit } = listQuery(query)
      const all = [...store.indexes.values()].map(indexView)
      return { body: { results: all.slice(offset, offset + limit), offset, limit, total: all.length } }
    },
  },
  {
    method: 'POST',
    path: '/indexes',
    answer: ({ tasks, body }) => {
      const { uid, primaryKey = null } = readAs(indexBody, body, 'invalid_index_uid')
      return accepted(tasks.accept({ type: 'indexCreation', indexUid: uid, primaryKey }))
    },
  },
  {
    method: 'GET',
    path: '/indexes/:uid',
    answer: ({ store, params: [uid = ''] }) => ({ body: indexView(store.index(uid)) }),
  },
  {
    method: 'PATCH',
    path: '/indexes/:uid',
    answer: ({ tasks, params: [indexUid = ''], body }) => {
      const { primaryKey = null } = readAs(indexChange, body)
      return accepted(tasks.accept({ type: 'indexUpdate', indexUid, primaryKey }))
    },
  },
  {
    method: 'DELETE',
    path: '/indexes/:uid',
    answer: ({ tasks, params: [indexUid = ''] }) => accepted(tasks.accept({ type: 'indexDeletion', indexUid })),
  },
  {
    method: 'GET',
    path: '/indexes/:uid/stats',
    answer: ({ store, params: [uid = ''] }) => ({ body: statsOf(store.index(uid)) }),
  },
  {
    method: 'POST',
    path: '/swap-indexes',
    answer: ({ tasks, body }) => {
      const swaps = readAs(swapsBody, body).map(({ indexes: pair }) => pair)
      return accepted(tasks.accept({ type: 'indexSwap', indexUid: null, swaps }))
    },
  },
]

const settings: Route[] = [
  {
    method: 'GET',
    path: '/indexes/:uid/settings',
    answer: ({ store, params: [uid = ''] }) => ({ body: store.index(uid).settings }),
  },
  {
    method: 'PATCH',
    path: '/indexes/:uid/settings',
    answer: ({ tasks, params: [indexUid = ''], body }) =>
      accepted(tasks.accept({ type: 'settingsUpdate', indexUid, settings: settingsChange(body) })),
  },
  {
    method: 'DELETE',
    path: '/indexes/:uid/settings',
    answer: ({ tasks, params: [indexUid = ''] }) =>
      accepted(tasks.accept({ type: 'settingsUpdate', indexUid, settings: defaultSettings() })),
  },
  {
    method: 'GET',
    path: '/indexes/:uid/settings/:name',
    answer: ({ store, params: [uid = '', name = ''] }) => ({ body: store.index(uid).settings[setting(name)] }),
  },
  // Lists and tables are PUT whole, objects are PATCHed; which is which is the API's own choice per setting.
  ...['PUT', 'PATCH', 'DELETE'].map((method): Route => ({
    method,
    path: '/indexes/:uid/settings/:name',
    answer: ({ tasks, params: [indexUid = '', name = ''], body }) => {
      const change = settingsChange({ [setting(name)]: method === 'DELETE' ? null : body })
      return accepted(tasks.accept({ type: 'settingsUpdate', indexUid, settings: change }))
    },
  })),
]

const taskRoutes: Route[] = [
  { method: 'GET', path: '/tasks', answer: ({ store, query }) => ({ body: tasksPage(store, query) }) },
  {
    method: 'GET',
    path: '/tasks/:uid',
    answer: ({ store, params: [uid = ''] }) => ({ body: taskAt(store, uid) satisfies Task }),
  },
]

/** Indexes, their settings and the tasks that change them. */
export const indexRoutes: Route[] = [...indexes, ...settings, ...taskRoutes]
