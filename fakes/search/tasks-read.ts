import { SearchError } from './errors'
import type { Json, Task } from './shapes'
import type { Store } from './store'

/** The task, or a 404 `task_not_found`. */
export function taskAt(store: Store, uid: string): Task {
  const task = store.tasks.find((each) => String(each.uid) === uid)
  if (!task) throw new SearchError(404, 'task_not_found', `Task \`${uid}\` not found.`)
  return task
}

/** Newest first, by `statuses`, `types`, `indexUids` and `uids`; `next` is the `from` of the page after. */
export function tasksPage(store: Store, query: URLSearchParams): { [key: string]: Json } {
  const limit = Number(query.get('limit') ?? 20)
  const from = Number(query.get('from') ?? Infinity)
  const within = (name: string, value: Json) => {
    const wanted = query.get(name)?.split(',') ?? ['*']
    return wanted.includes('*') || wanted.includes(String(value))
  }
  const all = store.tasks
    .filter((task) => within('statuses', task.status) && within('types', task.type))
    .filter((task) => within('indexUids', task.indexUid) && within('uids', task.uid))
    .reverse()
  const start = all.findIndex(({ uid }) => uid <= from)
  const page = start < 0 ? [] : all.slice(start, start + limit)
  const next = start < 0 ? null : (all[start + limit]?.uid ?? null)
  return { results: page, total: all.length, limit, from: page[0]?.uid ?? null, next }
}
