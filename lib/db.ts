import { AsyncLocalStorage, AsyncResource } from 'node:async_hooks'
import pg from 'pg'
import { Sequelize, type Transaction } from 'sequelize'
import { env } from './env'

type Ambient = AsyncLocalStorage<Map<string, unknown>>

// Next bundles pages and routes apart, and each copy of this module would open its own pool.
const shared = globalThis as unknown as { turnrowDatabase?: Sequelize; turnrowAmbient?: Ambient }

const ambient = (shared.turnrowAmbient ??= new AsyncLocalStorage<Map<string, unknown>>())

// Inside `inTransaction` every query joins the transaction, also one that forgot to name it.
const joinAmbient = Sequelize.useCLS.bind(Sequelize)
joinAmbient({
  get: (key: string) => ambient.getStore()?.get(key),
  set: (key: string, value: unknown) => ambient.getStore()?.set(key, value),
  run: (work: (context: unknown) => unknown) => {
    const context = new Map(ambient.getStore())
    return ambient.run(context, () => work(context))
  },
  bind: (work: () => unknown) => AsyncResource.bind(work),
})

function connect(): Sequelize {
  const sequelize = new Sequelize({
    dialect: 'postgres',
    dialectModule: pg,
    logging: false,
    define: { underscored: true },
    pool: { max: 10, idle: 10_000, acquire: 10_000 },
    dialectOptions: { statement_timeout: 20_000, idle_in_transaction_session_timeout: 30_000 },
    retry: { max: 0 },
  })
  // Where the database is gets read at the first connection, so that models can be loaded by a build without one.
  sequelize.addHook('beforeConnect', (config) => {
    const url = new URL(env().DATABASE_URL)
    Object.assign(config, {
      host: url.hostname,
      port: url.port || '5432',
      database: decodeURIComponent(url.pathname.slice(1)),
      username: decodeURIComponent(url.username),
      password: decodeURIComponent(url.password),
      ...(url.searchParams.has('sslmode') ? { ssl: true } : {}),
    })
  })
  return sequelize
}

/** The one connection pool of this process. Nothing connects before the first query. */
export const db = (): Sequelize => (shared.turnrowDatabase ??= connect())

/** Deadlock and serialization failure: the database asks for the whole transaction again. */
const TRY_AGAIN = new Set(['40001', '40P01'])

const codeOf = (failure: unknown) => (failure as { original?: { code?: string } } | null)?.original?.code ?? ''

/**
 * One transaction: state, letters, search refresh and jobs commit together or not at all.
 * Inside another `inTransaction` it joins that one. Runs `work` again, at most twice, when the database
 * broke a deadlock with this one.
 */
export async function inTransaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  const outer = ambient.getStore()?.get('transaction') as Transaction | undefined
  if (outer) return work(outer)
  for (let left = 2; ; left--) {
    try {
      return await db().transaction(work)
    } catch (failure) {
      if (left === 0 || !TRY_AGAIN.has(codeOf(failure))) throw failure
    }
  }
}
