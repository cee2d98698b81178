import type PgBoss from 'pg-boss'
import pg from 'pg'
import { log } from '@/lib/log'
import { worker } from './queue'
import { type Registered, registry } from './registry'

const ONE_WORKER = 727_002

/** Waits until no other worker is there. Killed, the connection closes and the lock is free at once. */
async function becomeTheWorker(connectionString: string): Promise<pg.Client> {
  const client = new pg.Client({ connectionString, application_name: 'turnrow-worker-lock', keepAlive: true })
  await client.connect()
  await client.query('select pg_advisory_lock($1)', [ONE_WORKER])
  return client
}

/** What a killed worker left half done goes back to the queue at once, not after its lease. */
async function takeBackOrphans(boss: PgBoss, client: pg.Client): Promise<void> {
  const { rows } = await client.query<{ name: string; id: string }>(
    `select name, id::text from pgboss.job where state = 'active'`,
  )
  for (const { name, id } of rows) await boss.fail(name, id, { message: 'the worker was killed' })
}

async function workOn(boss: PgBoss, { job, load, cron }: Registered): Promise<void> {
  if (cron) await boss.schedule(job.name, cron, {}, { singletonKey: 'scheduled' })
  for (let lane = 0; lane < job.atOnce; lane++)
    await boss.work(job.name, { pollingIntervalSeconds: 0.5 }, async ([taken]) => {
      if (!taken) return
      const started = performance.now()
      const about = { job: job.name, id: taken.id }
      try {
        const body = await load()
        await body(job.data.parse(taken.data))
        log.info({ ...about, took: Math.round(performance.now() - started) }, 'job done')
      } catch (failure) {
        log.error({ ...about, err: failure }, 'job failed')
        throw failure
      }
    })
}

export type Working = { stop: () => Promise<void> }

/** Starts working on every registered job. `stop` lets running ones finish for up to 20 s. */
export async function startWorking(connectionString: string): Promise<Working> {
  const lock = await becomeTheWorker(connectionString)
  const boss = worker(connectionString)
  boss.on('error', (failure) => log.error({ err: failure }, 'queue'))
  lock.on('error', (failure) => {
    log.fatal({ err: failure }, 'lost the database; stopping so that the supervisor starts a fresh worker')
    process.exit(1)
  })
  await boss.start()
  await takeBackOrphans(boss, lock)
  for (const one of registry) await workOn(boss, one)
  log.info({ jobs: registry.length }, 'worker is ready')
  return {
    stop: async () => {
      await boss.stop({ graceful: true, wait: true, timeout: 20_000 })
      await lock.end()
    },
  }
}
