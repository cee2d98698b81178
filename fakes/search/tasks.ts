import { errorBody } from './errors'
import type { Json, Task, Work } from './shapes'
import type { Store } from './store'
import { apply } from './work'

export type Tasks = {
  /** Keeps the work on disk and answers what a client gets with its 202. */
  accept(work: Work): { [key: string]: Json }
  /** Resolves when nothing is being worked on. */
  idle(): Promise<void>
}

function detailsAtFirst(work: Work): Record<string, Json> {
  if (work.type === 'documentAdditionOrUpdate') {
    return { receivedDocuments: work.documents.length, indexedDocuments: null }
  }
  if (work.type === 'documentDeletion') {
    const originalFilter = work.filter === undefined ? null : JSON.stringify(work.filter)
    return { providedIds: work.ids?.length ?? 0, originalFilter, deletedDocuments: null }
  }
  if (work.type === 'indexSwap') return { swaps: work.swaps.map((indexes) => ({ indexes, rename: false })) }
  return 'primaryKey' in work ? { primaryKey: work.primaryKey } : {}
}

function newTask(uid: number, work: Work): Task {
  return {
    uid,
    batchUid: null,
    indexUid: work.indexUid,
    status: 'enqueued',
    type: work.type,
    canceledBy: null,
    details: detailsAtFirst(work),
    error: null,
    duration: null,
    enqueuedAt: new Date().toISOString(),
    startedAt: null,
    finishedAt: null,
  }
}

function run(store: Store, task: Task, work: Work) {
  const started = new Date()
  Object.assign(task, { status: 'processing', startedAt: started.toISOString(), batchUid: task.uid })
  try {
    const { details, changed } = apply(store, work)
    for (const index of changed) {
      index.updatedAt = new Date().toISOString()
      store.saveIndex(index)
    }
    Object.assign(task, { status: 'succeeded', details: { ...task.details, ...details } })
  } catch (error) {
    Object.assign(task, { status: 'failed', error: errorBody(error) })
  }
  const finished = new Date()
  const duration = `PT${(finished.getTime() - started.getTime()) / 1000}S`
  Object.assign(task, { finishedAt: finished.toISOString(), duration })
}

/** Works off tasks one after another, in the order they came; what was accepted before a restart is done after it. */
export function openTasks(store: Store): Tasks {
  let working: Promise<void> | null = null

  const workOff = async () => {
    for (let next = store.waiting[0]; next; next = store.waiting[0]) {
      await new Promise((turn) => setImmediate(turn))
      const { uid, work } = next
      const task = store.tasks.find((each) => each.uid === uid)
      if (task) run(store, task, work)
      store.waiting.shift()
      store.saveCatalogue()
    }
  }
  const wake = () => {
    // What could not be written stays waiting, and the next task tries it again.
    working ??= workOff()
      .catch((error: Error) => console.error(`search: a task waits: ${error.message}`))
      .finally(() => (working = null))
  }

  wake()
  return {
    accept(work) {
      const task = newTask(store.nextTask, work)
      store.nextTask += 1
      store.tasks.push(task)
      store.waiting.push({ uid: task.uid, work })
      store.saveCatalogue()
      wake()
      const { uid: taskUid, indexUid, status, type, enqueuedAt } = task
      return { taskUid, indexUid, status, type, enqueuedAt }
    },
    idle: async () => working ?? undefined,
  }
}
