import { randomUUID } from 'node:crypto'
import PgBoss from 'pg-boss'
import type { Transaction } from 'sequelize'
import type { z } from 'zod'
import { db } from '@/lib/db'

/** A kind of job: its name, what it is given, and how patient the queue is with it. */
export type Job<T> = {
  name: string
  data: z.ZodType<T>
  /** tries after the first */
  retryLimit: number
  /** how long one try may take; longer than the longest real one */
  expireInSeconds: number
  /** how many run side by side in one worker */
  atOnce: number
}

type Settings = { retryLimit?: number; expireInSeconds?: number; atOnce?: number }

export const defineJob = <T>(name: string, data: z.ZodType<T>, settings: Settings = {}): Job<T> => ({
  name,
  data,
  retryLimit: settings.retryLimit ?? 5,
  expireInSeconds: settings.expireInSeconds ?? 300,
  atOnce: settings.atOnce ?? 1,
})

const SCHEMA = 'pgboss'

// pg-boss sends undefined for what is not set; Sequelize refuses that.
const through = (transaction?: Transaction) => ({
  async executeSql(text: string, values?: unknown[]) {
    const [rows] = await db().query(text, { bind: values?.map((value) => value ?? null), transaction })
    return { rows: rows as unknown[] }
  },
})

const shared = globalThis as unknown as { turnrowQueue?: Promise<PgBoss> }

/** The sending side: rides on our own pool, looks after nothing. */
const sender = (): Promise<PgBoss> =>
  (shared.turnrowQueue ??= new PgBoss({
    db: through(),
    schema: SCHEMA,
    supervise: false,
    schedule: false,
    migrate: false,
  }).start())

const found = new Set<string>()

/** pg-boss drops a job for an unknown queue without a word; here that is an error. */
async function refuseUnknown(queue: PgBoss, name: string): Promise<void> {
  if (found.has(name)) return
  if (!(await queue.getQueue(name))) throw new Error(`No queue is called ${name}: is it in lib/jobs/registry.ts?`)
  found.add(name)
}

type When = { transaction: Transaction; key?: string; startAfter?: Date; priority?: number }

/**
 * Puts a job on the queue as part of the caller's transaction: no commit, no job.
 * With a `key`, a second one is not added while the first still waits.
 */
export async function enqueue<T>(
  job: Job<T>,
  data: T,
  { transaction, key, startAfter, priority }: When,
): Promise<void> {
  const queue = await sender()
  await refuseUnknown(queue, job.name)
  await queue.send(job.name, job.data.parse(data) as object, {
    db: through(transaction),
    retryLimit: job.retryLimit,
    retryDelay: 2,
    retryBackoff: true,
    expireInSeconds: job.expireInSeconds,
    singletonKey: key ?? randomUUID(),
    ...(startAfter ? { startAfter } : {}),
    ...(priority ? { priority } : {}),
  })
}

/** The working side, with a connection of its own. The caller starts and stops it. */
export const worker = (connectionString: string): PgBoss =>
  new PgBoss({ connectionString, schema: SCHEMA, maintenanceIntervalSeconds: 30, application_name: 'turnrow-worker' })

/** Creates the queue's own tables and every queue; part of migrating. `short`: one waiting job per key. */
export async function prepareQueue(connectionString: string, jobs: readonly Job<never>[]): Promise<void> {
  const boss = new PgBoss({ connectionString, schema: SCHEMA, supervise: false, schedule: false })
  boss.on('error', () => undefined)
  await boss.start()
  for (const job of jobs) await boss.createQueue(job.name, { name: job.name, policy: 'short' })
  await boss.stop({ graceful: false, wait: true })
}
