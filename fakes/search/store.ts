import { randomUUID } from 'node:crypto'
import { openDisk } from './disk'
import { indexNotFound } from './errors'
import { defaultSettings, type Settings } from './settings'
import type { Doc, Index, Task, Work } from './shapes'

type Catalogue = {
  nextTask: number
  tasks: Task[]
  /** What tasks that were accepted and not yet done ask for: accepted means kept. */
  waiting: { uid: number; work: Work }[]
  indexes: Omit<Index, 'settings' | 'documents' | 'lexicon'>[]
}
type IndexFile = { settings: Settings; documents: Doc[] }

export type Store = {
  indexes: Map<string, Index>
  tasks: Task[]
  waiting: Catalogue['waiting']
  nextTask: number
  /** The index, or a 404 `index_not_found`. */
  index(uid: string): Index
  newIndex(uid: string, primaryKey: string | null): Index
  /** Writes the index's documents and settings. The catalogue, written after it, makes them count. */
  saveIndex(index: Index): void
  /** One file says which indexes there are and what each task came to; its rename is the moment a task is done. */
  saveCatalogue(): void
}

const TASKS_KEPT = 1000

/** The key of a document in a map: `id` 7 and "7" are the same document. */
export const keyOf = (document: Doc, primaryKey: string) => String(document[primaryKey])

/** Reads what is on the disk. One process at a time. */
export function openStore(directory: string): Store {
  const disk = openDisk(directory)
  const catalogue = (disk.read('catalogue') ?? { nextTask: 0, tasks: [], waiting: [], indexes: [] }) as Catalogue
  let filesKept = new Set(catalogue.indexes.map(({ file }) => file))

  const opened = (row: Catalogue['indexes'][number]): [string, Index] => {
    const { settings, documents } = (disk.read(row.file) ?? { settings: defaultSettings(), documents: [] }) as IndexFile
    const byKey = new Map(documents.map((document) => [keyOf(document, row.primaryKey ?? 'id'), document]))
    return [row.uid, { ...row, settings, documents: byKey, lexicon: null }]
  }

  const store: Store = {
    indexes: new Map(catalogue.indexes.map(opened)),
    tasks: catalogue.tasks,
    waiting: catalogue.waiting,
    nextTask: catalogue.nextTask,
    index(uid) {
      const index = store.indexes.get(uid)
      if (!index) throw indexNotFound(uid)
      return index
    },
    newIndex(uid, primaryKey) {
      const now = new Date().toISOString()
      const rest = { settings: defaultSettings(), documents: new Map<string, Doc>(), lexicon: null }
      const index = { uid, file: `index-${randomUUID()}`, primaryKey, createdAt: now, updatedAt: now, ...rest }
      store.indexes.set(uid, index)
      return index
    },
    saveIndex: ({ file, settings, documents }) => disk.write(file, { settings, documents: [...documents.values()] }),
    saveCatalogue() {
      // Waiting ones are the newest, so these are all done.
      store.tasks.splice(0, store.tasks.length - TASKS_KEPT - store.waiting.length)
      const indexes = [...store.indexes.values()].map(({ uid, file, primaryKey, createdAt, updatedAt }) => ({
        uid,
        file,
        primaryKey,
        createdAt,
        updatedAt,
      }))
      const { nextTask, tasks, waiting } = store
      disk.write('catalogue', { nextTask, tasks, waiting, indexes } satisfies Catalogue)
      const files = new Set(indexes.map(({ file }) => file))
      for (const file of filesKept) if (!files.has(file)) disk.remove(file)
      filesKept = files
    },
  }
  return store
}
