import type { ErrorBody } from './errors'
import type { Lexicon } from './lexicon'
import type { Settings } from './settings'

export type Json = string | number | boolean | null | Json[] | { [key: string]: Json }
export type Doc = { [field: string]: Json }

/** One index in memory. `lexicon` is derived from documents and settings, made at the first search. */
export type Index = {
  uid: string
  file: string
  primaryKey: string | null
  createdAt: string
  updatedAt: string
  settings: Settings
  documents: Map<string, Doc>
  lexicon: Lexicon | null
}

/** What a write asks for. Every write is a task: accepted with 202, done later, its outcome read at /tasks/{uid}. */
export type Work =
  | { type: 'indexCreation' | 'indexUpdate'; indexUid: string; primaryKey: string | null }
  | { type: 'indexDeletion'; indexUid: string }
  | {
      type: 'documentAdditionOrUpdate'
      indexUid: string
      documents: Doc[]
      merge: boolean
      primaryKey: string | null
    }
  | { type: 'documentDeletion'; indexUid: string; ids?: string[]; filter?: Json }
  | { type: 'settingsUpdate'; indexUid: string; settings: Partial<Settings> }
  | { type: 'indexSwap'; indexUid: null; swaps: [string, string][] }

export type Task = {
  uid: number
  batchUid: number | null
  indexUid: string | null
  status: 'enqueued' | 'processing' | 'succeeded' | 'failed'
  type: Work['type']
  canceledBy: null
  details: Record<string, Json>
  error: ErrorBody | null
  duration: string | null
  enqueuedAt: string
  startedAt: string | null
  finishedAt: string | null
}
